export interface NamedFault {
  name: string;
  message: string;
}

/** Formik's nested errors as a flat list in the order of the values, names as the fields have them. */
export function faultsByName(errors: unknown, prefix = ''): NamedFault[] {
  if (typeof errors === 'string') return [{ name: prefix, message: errors }];
  if (Array.isArray(errors))
    return errors.flatMap((entry, index) => faultsByName(entry, `${prefix}[${index}]`));
  if (typeof errors !== 'object' || errors === null) return [];
  return Object.entries(errors).flatMap(([key, entry]) =>
    faultsByName(entry, prefix === '' ? key : `${prefix}.${key}`),
  );
}
