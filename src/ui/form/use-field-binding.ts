import { getIn, useFormikContext } from 'formik';
import { controlId, useFormContextValue } from './form-context';

export interface FieldBinding {
  id: string;
  value: unknown;
  error: string | undefined;
  onChange: (value: unknown) => void;
  onBlur: () => void;
}

/** Ties one path of the form's values to a control. A fault shows once the field was left or the form was sent. */
export function useFieldBinding(name: string): FieldBinding {
  const formik = useFormikContext<object>();
  const { formId, serverFaults } = useFormContextValue();
  const value: unknown = getIn(formik.values, name);
  const ownError: unknown = getIn(formik.errors, name);
  const isTouched = getIn(formik.touched, name) === true || formik.submitCount > 0;
  const serverFault = serverFaults[name];
  const serverError =
    serverFault !== undefined && Object.is(serverFault.valueSent, value) ? serverFault.message : undefined;
  return {
    id: controlId(formId, name),
    value,
    error: isTouched && typeof ownError === 'string' ? ownError : serverError,
    onChange: (next) => void formik.setFieldValue(name, next),
    onBlur: () => void formik.setFieldTouched(name, true),
  };
}

export function asText(value: unknown): string {
  return typeof value === 'string' ? value : value === undefined || value === null ? '' : String(value);
}
