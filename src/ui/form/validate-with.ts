import { setIn } from 'formik';
import type { FormikErrors } from 'formik';
import { ValidationError } from 'yup';
import type { Schema } from 'yup';

/**
 * Formik's `validate` from a schema of the contract. A form holds what was typed; `toRequest` makes of it what would be
 * sent, with the same paths, and the schema judges that. The first fault of a path is the one shown.
 */
export function validateWith<Values extends object>(schema: Schema, toRequest: (values: Values) => unknown) {
  return (values: Values): FormikErrors<Values> => {
    try {
      schema.validateSync(toRequest(values), { abortEarly: false });
      return {};
    } catch (error) {
      if (!(error instanceof ValidationError)) throw error;
      const faults = error.inner.length === 0 ? [error] : error.inner;
      const seen = new Set<string>();
      let errors: FormikErrors<Values> = {};
      for (const fault of faults) {
        const path = fault.path ?? '';
        if (path === '' || seen.has(path)) continue;
        seen.add(path);
        errors = setIn(errors, path, fault.message) as FormikErrors<Values>;
      }
      return errors;
    }
  };
}
