import { getIn, setIn, type FormikErrors } from 'formik';
import * as yup from 'yup';
import { rangeInWords } from '../../../shared/contract/fields';
import {
  displayUnit,
  parseNumber,
  type DisplayKindName,
  type DisplayUnitSystem,
} from '../../../shared/units/format';

interface Validatable {
  validateSync(value: unknown, options: { abortEarly: boolean; strict: boolean }): unknown;
}

/** First message per path of a spec, by the same schema that the server uses. Empty when all is well. */
export function specFaults(schema: Validatable, spec: unknown): Record<string, string> {
  try {
    schema.validateSync(spec, { abortEarly: false, strict: true });
    return {};
  } catch (error) {
    if (!(error instanceof yup.ValidationError)) throw error;
    const faults: Record<string, string> = {};
    for (const each of error.inner.length > 0 ? error.inner : [error]) {
      const path = each.path ?? '';
      faults[path] ??= each.message;
    }
    return faults;
  }
}

/** Faults as Formik keeps them: nested like the values. A group's own message gives way to those of its fields. */
export function formikErrors<Values>(faults: Record<string, string>): FormikErrors<Values> {
  const paths = Object.keys(faults);
  let errors: FormikErrors<Values> = {};
  for (const path of paths) {
    const hasFaultWithin = paths.some(
      (other) => other.startsWith(`${path}.`) || other.startsWith(`${path}[`),
    );
    if (!hasFaultWithin) errors = setIn(errors, path, faults[path]) as FormikErrors<Values>;
  }
  return errors;
}

/** 'Horizon: …' as 'Look ahead: …', where the field is called that on the page. Whole sentences stay. */
export function relabelled(message: string, label: string | undefined): string {
  return label === undefined ? message : message.replace(/^[^:“.]+:/, `${label}:`);
}

/** In the summary of a form two fields may share a label: 'Oxygen, value: …' says which one is meant. */
export function faultWithin(group: string, message: string): string {
  return `${group}, ${message.charAt(0).toLowerCase()}${message.slice(1)}`;
}

/**
 * The schema speaks in stored units. Where the person typed in another, or no number at all, the same rule is said
 * with what they typed: 'Gauge: 0 mil does not fit; use more than 0 and at most 78.7402 mil.'
 */
export function faultAsTyped(
  message: string,
  typed: {
    text: string;
    kind: DisplayKindName;
    unitSystem: DisplayUnitSystem;
    min: number;
    max: number;
    isMinExcluded?: boolean;
  },
): string {
  const label = message.split(':')[0] ?? message;
  const { unit, factor, offset } = displayUnit(typed.kind, typed.unitSystem);
  const shown = (stored: number) => stored * factor + (offset ?? 0);
  const words = rangeInWords({
    label,
    unit,
    min: shown(typed.min),
    max: shown(typed.max),
    isMinExcluded: typed.isMinExcluded ?? false,
  });
  if (typed.text.trim() === '') return `${label}: enter a number, ${words}.`;
  if (Number.isNaN(parseNumber(typed.text)))
    return `${label}: “${typed.text.trim()}” is no number; enter ${words}.`;
  const given = unit === '' ? typed.text.trim() : `${typed.text.trim()} ${unit}`;
  return `${label}: ${given} does not fit; use ${words}.`;
}

/** The bounds that a schema keeps for the number at a path, where there are any. */
export function boundsAt(
  schema: yup.ISchema<unknown>,
  path: string,
  spec: unknown,
): { min: number; max: number; isMinExcluded: boolean } | null {
  const reached = reachOrNull(schema, path, spec);
  const described = reached?.describe({ value: getIn(spec, path) });
  const meta =
    described && 'meta' in described ? (described.meta as Record<string, unknown> | undefined) : undefined;
  if (typeof meta?.minimum !== 'number' || typeof meta.maximum !== 'number') return null;
  return { min: meta.minimum, max: meta.maximum, isMinExcluded: meta.isMinExcluded === true };
}

function reachOrNull(schema: yup.ISchema<unknown>, path: string, spec: unknown): yup.ISchema<unknown> | null {
  try {
    return yup.reach(schema as yup.Schema, path, spec) as yup.ISchema<unknown>;
  } catch {
    return null;
  }
}
