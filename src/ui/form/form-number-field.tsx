import { NumberField } from '../number-field';
import type { NumberInputOptions } from '../number-field';
import { asText, useFieldBinding } from './use-field-binding';

export interface FormNumberFieldProps {
  /** The form holds the text as typed; make a number of it with parseTypedNumber when validating and sending. */
  name: string;
  label: string;
  unit?: string;
  hint?: string;
  options?: NumberInputOptions;
}

export function FormNumberField({ name, label, unit, hint, options }: FormNumberFieldProps) {
  const field = useFieldBinding(name);
  return (
    <NumberField
      id={field.id}
      label={label}
      unit={unit}
      hint={hint}
      options={options}
      value={asText(field.value)}
      error={field.error}
      onChange={field.onChange}
      onBlur={field.onBlur}
    />
  );
}
