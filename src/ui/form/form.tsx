import { Formik, getIn } from 'formik';
import type { FormikConfig, FormikErrors, FormikProps } from 'formik';
import { useId, useMemo, useRef, useState } from 'react';
import type { ReactNode } from 'react';
import { View } from 'react-native';
import { SPACE } from '../tokens';
import { FormContext } from './form-context';
import type { ServerFault } from './form-context';

export interface FormProps<Values extends object> {
  initialValues: Values;
  validate: (values: Values) => FormikErrors<Values>;
  /** Throws what the server said; an error with `fields: [{path, message}]` lands on those fields. */
  onSubmit: (values: Values) => Promise<void>;
  /** From the request's path to the field's name, where the two differ. */
  toFieldName?: (path: string) => string;
  label?: string;
  children: ReactNode | ((formik: FormikProps<Values>) => ReactNode);
}

/**
 * Validates a field when it is left, then while it is changed, all of them on submit; never rewrites what was typed;
 * the first faulty field gets the focus.
 */
export function Form<Values extends object>(props: FormProps<Values>) {
  const { initialValues, validate, onSubmit, toFieldName = (path) => path, label, children } = props;
  const formId = useId();
  const formRef = useRef<HTMLFormElement>(null);
  // Formik's own flag is drawn a moment later: too late for the second click of a double click.
  const isSending = useRef(false);
  const [serverFaults, setServerFaults] = useState<Record<string, ServerFault>>({});
  const [formFault, setFormFault] = useState<string | null>(null);
  const context = useMemo(() => ({ formId, serverFaults, formFault }), [formId, serverFaults, formFault]);

  const focusFirstFault = () => {
    // After React has drawn the faults.
    setTimeout(() => {
      const faulty = formRef.current?.querySelector<HTMLElement>('[aria-invalid="true"]');
      faulty?.focus();
    }, 0);
  };

  const submit: FormikConfig<Values>['onSubmit'] = async (values) => {
    setServerFaults({});
    setFormFault(null);
    try {
      await onSubmit(values);
    } catch (error) {
      const fields = faultsOf(error);
      const found: Record<string, ServerFault> = {};
      for (const fault of fields) {
        const name = toFieldName(fault.path);
        found[name] ??= { message: fault.message, valueSent: getIn(values, name) as unknown };
      }
      setServerFaults(found);
      if (fields.length === 0)
        setFormFault(error instanceof Error ? error.message : 'That did not work. Try again.');
      focusFirstFault();
    }
  };

  return (
    <Formik
      initialValues={initialValues}
      validate={validate}
      onSubmit={submit}
      validateOnBlur
      validateOnChange
    >
      {(formik) => (
        <FormContext.Provider value={context}>
          <form
            ref={formRef}
            id={formId}
            aria-label={label}
            noValidate
            onSubmit={(event) => {
              event.preventDefault();
              if (isSending.current) return;
              isSending.current = true;
              void formik.submitForm().finally(() => {
                isSending.current = false;
                focusIfFaulty();
              });
            }}
          >
            {/* Enter in a field submits only where the form has a submit button of its own kind. */}
            <input type="submit" hidden />
            <View style={{ gap: SPACE.x4 }}>
              {typeof children === 'function' ? children(formik) : children}
            </View>
          </form>
        </FormContext.Provider>
      )}
    </Formik>
  );

  function focusIfFaulty() {
    const active = document.activeElement;
    if (active instanceof HTMLElement && active.getAttribute('aria-invalid') === 'true') return;
    focusFirstFault();
  }
}

interface Fault {
  path: string;
  message: string;
}

function faultsOf(error: unknown): Fault[] {
  if (typeof error !== 'object' || error === null || !('fields' in error) || !Array.isArray(error.fields))
    return [];
  return error.fields.filter(isFault);
}

function isFault(entry: unknown): entry is Fault {
  return (
    typeof entry === 'object' &&
    entry !== null &&
    'path' in entry &&
    typeof entry.path === 'string' &&
    entry.path !== '' &&
    'message' in entry &&
    typeof entry.message === 'string'
  );
}
