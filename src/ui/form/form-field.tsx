import { TextField } from '../text-field';
import type { TextInputOptions } from '../text-field';
import { asText, useFieldBinding } from './use-field-binding';

export interface FormFieldProps {
  name: string;
  label: string;
  hint?: string;
  options?: TextInputOptions;
}

export function FormField({ name, label, hint, options }: FormFieldProps) {
  const field = useFieldBinding(name);
  return (
    <TextField
      id={field.id}
      label={label}
      hint={hint}
      options={options}
      value={asText(field.value)}
      error={field.error}
      onChange={field.onChange}
      onBlur={field.onBlur}
    />
  );
}
