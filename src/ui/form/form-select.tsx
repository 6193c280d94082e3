import { Select } from '../select';
import type { SelectGroup, SelectOption } from '../select';
import { asText, useFieldBinding } from './use-field-binding';

export interface FormSelectProps {
  name: string;
  label: string;
  options: (SelectOption | SelectGroup)[];
  hint?: string;
}

export function FormSelect({ name, label, options, hint }: FormSelectProps) {
  const field = useFieldBinding(name);
  return (
    <Select
      id={field.id}
      label={label}
      options={options}
      hint={hint}
      value={asText(field.value)}
      error={field.error}
      onChange={field.onChange}
      onBlur={field.onBlur}
    />
  );
}
