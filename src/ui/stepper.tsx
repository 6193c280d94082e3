import { useId } from 'react';
import type { KeyboardEvent } from 'react';
import { Pressable, View } from 'react-native';
import { FieldError, fieldDescription } from './field';
import { Icon } from './icon';
import { Small } from './text';
import { useTheme } from './theme';
import { FONTS, HAIRLINE_PX, RADIUS_PX, ROW_MIN_PX, SIZES, SPACE } from './tokens';
import { stepTypedNumber } from './typed-number';

export interface StepperProps {
  /** For readers and for the two buttons: 'Gauge of LDPE'. */
  label: string;
  value: string;
  onChange: (text: string) => void;
  onBlur?: () => void;
  unit: string;
  step: { by: number; min?: number; max?: number };
  error?: string;
  id?: string;
}

/** Less, the number itself to type into, more. Arrow keys in the box step as well. */
export function Stepper({ label, value, onChange, onBlur, unit, step, error, id }: StepperProps) {
  const { colors } = useTheme();
  const ownId = useId();
  const controlId = id ?? ownId;
  const hasError = error !== undefined && error !== '';
  const stepBy = (by: number) => onChange(stepTypedNumber(value, by, step));
  const onKeyDown = (event: KeyboardEvent<HTMLInputElement>) => {
    if (event.key !== 'ArrowUp' && event.key !== 'ArrowDown') return;
    event.preventDefault();
    stepBy(event.key === 'ArrowUp' ? step.by : -step.by);
  };
  return (
    <View style={{ gap: SPACE.x1 }}>
      <View
        role="group"
        aria-label={label}
        style={{
          flexDirection: 'row',
          alignSelf: 'flex-start',
          borderWidth: hasError ? 2 : HAIRLINE_PX,
          borderColor: hasError ? colors.ink : colors.inkThird,
          borderRadius: RADIUS_PX,
          backgroundColor: colors.sheet,
        }}
      >
        <StepButton icon="minus" label={`${label}: less`} onPress={() => stepBy(-step.by)} />
        <View
          style={{
            flexDirection: 'row',
            alignItems: 'center',
            borderLeftWidth: HAIRLINE_PX,
            borderRightWidth: HAIRLINE_PX,
            borderColor: colors.line,
            paddingRight: SPACE.x2,
          }}
        >
          <input
            id={controlId}
            type="text"
            inputMode="decimal"
            autoComplete="off"
            aria-label={`${label}, ${unit}`}
            aria-invalid={hasError || undefined}
            aria-describedby={fieldDescription(controlId, { error })}
            value={value}
            onBlur={onBlur}
            onKeyDown={onKeyDown}
            onChange={(event) => onChange(event.target.value)}
            style={{
              width: `calc(${Math.max(4, value.length) + 1}ch + ${SPACE.x1 + SPACE.x2}px)`,
              minHeight: ROW_MIN_PX,
              boxSizing: 'border-box',
              border: 0,
              padding: `0 ${SPACE.x1}px 0 ${SPACE.x2}px`,
              textAlign: 'right',
              background: 'transparent',
              color: colors.ink,
              fontFamily: FONTS.monoMedium,
              fontSize: SIZES.heading,
            }}
          />
          <Small>{unit}</Small>
        </View>
        <StepButton icon="add" label={`${label}: more`} onPress={() => stepBy(step.by)} />
      </View>
      <FieldError id={controlId} error={error} />
    </View>
  );
}

function StepButton({ icon, label, onPress }: { icon: 'minus' | 'add'; label: string; onPress: () => void }) {
  const { colors } = useTheme();
  return (
    <Pressable
      role="button"
      aria-label={label}
      onPress={onPress}
      style={({ pressed, hovered }) => ({
        width: ROW_MIN_PX,
        minHeight: ROW_MIN_PX,
        alignItems: 'center',
        justifyContent: 'center',
        backgroundColor: pressed || hovered ? colors.lineFaint : 'transparent',
      })}
    >
      <Icon name={icon} sizePx={16} />
    </Pressable>
  );
}
