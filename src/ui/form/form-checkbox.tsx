import { Checkbox } from '../checkbox';
import { useFieldBinding } from './use-field-binding';

export interface FormCheckboxProps {
  name: string;
  label: string;
  hint?: string;
}

export function FormCheckbox({ name, label, hint }: FormCheckboxProps) {
  const field = useFieldBinding(name);
  return (
    <Checkbox
      id={field.id}
      label={label}
      hint={hint}
      isChecked={field.value === true}
      error={field.error}
      onChange={field.onChange}
    />
  );
}
