import { Choice } from '../choice';
import type { ChoiceOption } from '../choice';
import { asText, useFieldBinding } from './use-field-binding';

export interface FormChoiceProps {
  name: string;
  label: string;
  options: ChoiceOption[];
  hint?: string;
}

export function FormChoice({ name, label, options, hint }: FormChoiceProps) {
  const field = useFieldBinding(name);
  return (
    <Choice
      id={field.id}
      label={label}
      options={options}
      hint={hint}
      value={asText(field.value)}
      error={field.error}
      onChange={field.onChange}
    />
  );
}
