import { getIn, type FormikErrors } from 'formik';
import type * as yup from 'yup';
import {
  displayUnit,
  parseNumber,
  type DisplayKindName,
  type DisplayUnitSystem,
} from '../../../shared/units/format';
import { boundsAt, faultAsTyped, formikErrors, relabelled, specFaults } from './spec-faults';

export interface KeptFormRules<Values> {
  schema: yup.ISchema<unknown> & {
    validateSync(value: unknown, options: { abortEarly: boolean; strict: boolean }): unknown;
  };
  /** What would be sent; a field's path in it is the field's name in the form. */
  toSpec: (values: Values) => unknown;
  /** What the number at a path measures; null for text. */
  kindAt: (path: string) => DisplayKindName | null;
  unitSystem: DisplayUnitSystem;
  /** What stands above the field at a path, where the schema calls it otherwise. */
  labelAt?: (path: string) => string | undefined;
}

/** Formik's `validate` by the contract's own schema, its messages put in the units that were typed. */
export function validateKeptForm<Values extends object>(rules: KeptFormRules<Values>) {
  return (values: Values): FormikErrors<Values> => {
    const spec = rules.toSpec(values);
    const faults = specFaults(rules.schema, spec);
    for (const [path, message] of Object.entries(faults)) {
      const typed = inTypedUnits({ path, message, spec, text: getIn(values, path) }, rules);
      faults[path] = relabelled(typed, rules.labelAt?.(path));
    }
    return formikErrors<Values>(faults);
  };
}

export interface FoundFault {
  path: string;
  message: string;
  spec: unknown;
  /** What stands in the field, where it is text. */
  text: unknown;
}

/** A message of the schema as the person should read it: in the unit that was typed, with what was typed. */
export function inTypedUnits(
  fault: FoundFault,
  rules: Pick<KeptFormRules<never>, 'schema' | 'kindAt' | 'unitSystem'>,
): string {
  const { path, message, text, spec } = fault;
  const kind = rules.kindAt(path);
  if (kind === null || typeof text !== 'string') return message;
  const { factor, offset } = displayUnit(kind, rules.unitSystem);
  const isStoredUnit = factor === 1 && (offset ?? 0) === 0;
  const isBlank = text.trim() === '';
  const isNumber = !isBlank && Number.isFinite(parseNumber(text));
  if (isStoredUnit && (isNumber || isBlank)) return message;
  const bounds = boundsAt(rules.schema, path, spec);
  if (bounds === null) return message;
  const value = (parseNumber(text) - (offset ?? 0)) / factor;
  const isInBounds = value <= bounds.max && (bounds.isMinExcluded ? value > bounds.min : value >= bounds.min);
  // In bounds and refused all the same: another rule speaks, in its own words.
  if (isNumber && isInBounds) return message;
  return faultAsTyped(message, { text, kind, unitSystem: rules.unitSystem, ...bounds });
}
