import { createContext, useContext } from 'react';

/** A fault the server found, and the value it found it in: it stands until that value is changed. */
export interface ServerFault {
  message: string;
  valueSent: unknown;
}

export interface FormContextValue {
  formId: string;
  serverFaults: Record<string, ServerFault>;
  /** What the server refused without naming a field. */
  formFault: string | null;
}

export const FormContext = createContext<FormContextValue>({
  formId: 'form',
  serverFaults: {},
  formFault: null,
});

export function useFormContextValue(): FormContextValue {
  return useContext(FormContext);
}

/** The DOM id of a field's control. */
export function controlId(formId: string, name: string): string {
  return `${formId}-${name}`;
}
