import { useId } from 'react';
import { View } from 'react-native';
import { FieldError, fieldDescription } from './field';
import { Icon } from './icon';
import { Small } from './text';
import { useTheme } from './theme';
import { FONTS, RADIUS_PX, ROW_MIN_PX, SIZES, SPACE } from './tokens';

const BOX_PX = 20;

export interface CheckboxProps {
  label: string;
  isChecked: boolean;
  onChange: (isChecked: boolean) => void;
  hint?: string;
  error?: string;
  id?: string;
}

export function Checkbox({ label, isChecked, onChange, hint, error, id }: CheckboxProps) {
  const { colors } = useTheme();
  const ownId = useId();
  const controlId = id ?? ownId;
  const hasError = error !== undefined && error !== '';
  return (
    <View style={{ gap: SPACE.x1 }}>
      <label
        htmlFor={controlId}
        style={{
          display: 'flex',
          alignItems: 'center',
          gap: SPACE.x3,
          minHeight: ROW_MIN_PX,
          cursor: 'pointer',
          fontFamily: FONTS.regular,
          fontSize: SIZES.body,
          lineHeight: 1.4,
          color: colors.ink,
        }}
      >
        <span style={{ position: 'relative', display: 'inline-flex', flexShrink: 0 }}>
          <input
            id={controlId}
            type="checkbox"
            checked={isChecked}
            onChange={(event) => onChange(event.target.checked)}
            aria-invalid={hasError || undefined}
            aria-describedby={fieldDescription(controlId, { hint, error })}
            style={{
              appearance: 'none',
              width: BOX_PX,
              height: BOX_PX,
              margin: 0,
              border: `${hasError ? 2 : 1}px solid ${hasError || isChecked ? colors.ink : colors.inkThird}`,
              borderRadius: RADIUS_PX,
              backgroundColor: isChecked ? colors.ink : colors.sheet,
              cursor: 'pointer',
            }}
          />
          {isChecked ? (
            <span style={{ position: 'absolute', inset: 3, pointerEvents: 'none', lineHeight: 0 }}>
              <Icon name="check" sizePx={BOX_PX - 6} color={colors.sheet} />
            </span>
          ) : null}
        </span>
        {label}
      </label>
      {hint === undefined ? null : <Small id={`${controlId}-hint`}>{hint}</Small>}
      <FieldError id={controlId} error={error} />
    </View>
  );
}
