import { useId } from 'react';
import { View } from 'react-native';
import { controlStyle } from './control-style';
import { Field, fieldDescription } from './field';
import { Icon } from './icon';
import { useTheme } from './theme';
import { SPACE } from './tokens';

export interface SelectOption {
  value: string;
  label: string;
}

export interface SelectGroup {
  label: string;
  options: SelectOption[];
}

export interface SelectProps {
  label: string;
  value: string;
  onChange: (value: string) => void;
  /** Begin with {value: '', label: 'Choose a food'} where nothing is chosen yet. */
  options: (SelectOption | SelectGroup)[];
  onBlur?: () => void;
  hint?: string;
  error?: string;
  id?: string;
}

/** The browser's own list: a phone's wheel and a keyboard's type-ahead come with it. */
export function Select({ label, value, onChange, options, onBlur, hint, error, id }: SelectProps) {
  const { colors } = useTheme();
  const ownId = useId();
  const controlId = id ?? ownId;
  const hasError = error !== undefined && error !== '';
  return (
    <Field id={controlId} label={label} hint={hint} error={error}>
      <View style={{ justifyContent: 'center' }}>
        <select
          id={controlId}
          value={value}
          onBlur={onBlur}
          onChange={(event) => onChange(event.target.value)}
          aria-invalid={hasError || undefined}
          aria-describedby={fieldDescription(controlId, { hint, error })}
          style={{
            ...controlStyle(colors, { hasError, isFigure: false }),
            appearance: 'none',
            paddingRight: SPACE.x8 + SPACE.x1,
            textOverflow: 'ellipsis',
          }}
        >
          {options.map((entry) =>
            'options' in entry ? (
              <optgroup key={entry.label} label={entry.label}>
                {entry.options.map(renderOption)}
              </optgroup>
            ) : (
              renderOption(entry)
            ),
          )}
        </select>
        <View style={{ position: 'absolute', right: SPACE.x3, pointerEvents: 'none' }}>
          <Icon name="open" sizePx={14} />
        </View>
      </View>
    </Field>
  );
}

function renderOption(option: SelectOption) {
  return (
    <option key={option.value} value={option.value}>
      {option.label}
    </option>
  );
}
