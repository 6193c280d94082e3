import { useId } from 'react';
import { View } from 'react-native';
import { controlStyle } from './control-style';
import { Field, fieldDescription } from './field';
import { Small } from './text';
import { useTheme } from './theme';
import { SPACE } from './tokens';

export interface NumberInputOptions {
  isOptional?: boolean;
  /** The width of the box in characters, where the row should not be filled. */
  widthInCharacters?: number;
}

export interface NumberFieldProps {
  label: string;
  /** Exactly what was typed; parseTypedNumber reads it. */
  value: string;
  onChange: (text: string) => void;
  onBlur?: () => void;
  unit?: string;
  hint?: string;
  error?: string;
  id?: string;
  options?: NumberInputOptions;
}

export function NumberField(props: NumberFieldProps) {
  const { label, value, onChange, onBlur, unit = '', hint, error, id, options = {} } = props;
  const { colors } = useTheme();
  const ownId = useId();
  const controlId = id ?? ownId;
  const hasError = error !== undefined && error !== '';
  const describedBy = [
    unit === '' ? '' : `${controlId}-unit`,
    fieldDescription(controlId, { hint, error }) ?? '',
  ]
    .filter((part) => part !== '')
    .join(' ');
  const width = options.widthInCharacters;
  return (
    <Field
      id={controlId}
      label={label}
      hint={hint}
      error={error}
      note={options.isOptional === true ? 'optional' : undefined}
    >
      <View style={{ flexDirection: 'row', alignItems: 'center', gap: SPACE.x2 }}>
        <input
          id={controlId}
          type="text"
          inputMode="decimal"
          autoComplete="off"
          value={value}
          onBlur={onBlur}
          onChange={(event) => onChange(event.target.value)}
          aria-invalid={hasError || undefined}
          aria-required={options.isOptional === true ? undefined : true}
          aria-describedby={describedBy === '' ? undefined : describedBy}
          style={{
            ...controlStyle(colors, { hasError, isFigure: true }),
            ...(width === undefined ? { flex: 1, maxWidth: 240 } : { width: `${width + 4}ch` }),
          }}
        />
        {unit === '' ? null : <Small id={`${controlId}-unit`}>{unit}</Small>}
      </View>
    </Field>
  );
}
