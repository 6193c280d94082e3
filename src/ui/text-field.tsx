import { useId } from 'react';
import { controlStyle } from './control-style';
import { Field, fieldDescription } from './field';
import { useTheme } from './theme';

export interface TextInputOptions {
  type?: 'text' | 'email' | 'password' | 'search';
  autoComplete?: string;
  /** From two on it is a box of that many lines. */
  lines?: number;
  isOptional?: boolean;
}

export interface TextFieldProps {
  label: string;
  value: string;
  onChange: (text: string) => void;
  onBlur?: () => void;
  hint?: string;
  error?: string;
  id?: string;
  options?: TextInputOptions;
}

export function TextField({ label, value, onChange, onBlur, hint, error, id, options = {} }: TextFieldProps) {
  const { colors } = useTheme();
  const ownId = useId();
  const controlId = id ?? ownId;
  const hasError = error !== undefined && error !== '';
  const shared = {
    id: controlId,
    value,
    onBlur,
    autoComplete: options.autoComplete,
    'aria-invalid': hasError || undefined,
    'aria-required': options.isOptional === true ? undefined : true,
    'aria-describedby': fieldDescription(controlId, { hint, error }),
    style: controlStyle(colors, { hasError, isFigure: false }),
  };
  return (
    <Field
      id={controlId}
      label={label}
      hint={hint}
      error={error}
      note={options.isOptional === true ? 'optional' : undefined}
    >
      {options.lines !== undefined && options.lines > 1 ? (
        <textarea {...shared} rows={options.lines} onChange={(event) => onChange(event.target.value)} />
      ) : (
        <input {...shared} type={options.type ?? 'text'} onChange={(event) => onChange(event.target.value)} />
      )}
    </Field>
  );
}
