import { InputError } from './input-error';
import type { NumericRange } from './ranges';

/** What a number may be, what it is called in messages, and the unit printed behind it. */
export interface NumberRule {
  range: NumericRange;
  label: string;
  unit?: string;
}

function withUnit(value: number, unit: string | undefined): string {
  return unit ? `${value} ${unit}` : String(value);
}

/** "0 to 1", "more than 0 and at most 10000 m²". */
export function rangeInWords(range: NumericRange, unit?: string): string {
  const max = withUnit(range.max, unit);
  return range.isMinExcluded ? `more than ${range.min} and at most ${max}` : `${range.min} to ${max}`;
}

/** A finite number within a range; InputError with path, value and remedy otherwise. */
export function readNumber(value: unknown, path: string, rule: NumberRule): number {
  const { range, label, unit } = rule;
  const use = rangeInWords(range, unit);
  if (value === undefined || value === null) {
    throw new InputError(path, value ?? null, `${label} is missing: give ${use}.`);
  }
  if (typeof value !== 'number' || !Number.isFinite(value)) {
    throw new InputError(path, String(value), `${label} must be a number, ${use}.`);
  }
  const isAboveMin = range.isMinExcluded ? value > range.min : value >= range.min;
  if (!isAboveMin || value > range.max) {
    throw new InputError(path, value, `${label} ${withUnit(value, unit)} does not fit; use ${use}.`);
  }
  return value;
}

/** As readNumber, with a value to use where none is given. */
export function readOptional(value: unknown, path: string, rule: NumberRule & { otherwise: number }): number {
  return value === undefined || value === null ? rule.otherwise : readNumber(value, path, rule);
}

/** A list within a count; InputError otherwise. */
export function readList<Item>(
  value: unknown,
  path: string,
  rule: { range: NumericRange; label: string },
): Item[] {
  const { range, label } = rule;
  if (!Array.isArray(value)) throw new InputError(path, describe(value), `${label}: a list is needed.`);
  if (value.length < range.min) {
    throw new InputError(
      path,
      value.length,
      `${label}: at least ${range.min} needed, ${value.length} given.`,
    );
  }
  if (value.length > range.max) {
    throw new InputError(
      path,
      value.length,
      `${label}: at most ${range.max} allowed, ${value.length} given.`,
    );
  }
  return value as Item[];
}

/** An object; InputError otherwise. */
export function readObject<Shape extends object>(value: unknown, path: string, label: string): Shape {
  if (typeof value !== 'object' || value === null || Array.isArray(value)) {
    throw new InputError(path, describe(value), `${label} is missing.`);
  }
  return value as Shape;
}

/** One of a few words; InputError otherwise. */
export function readChoice<Choice extends string>(
  value: unknown,
  path: string,
  rule: { choices: readonly Choice[]; label: string },
): Choice {
  const { choices, label } = rule;
  const found = choices.find((choice) => choice === value);
  if (found === undefined) {
    throw new InputError(
      path,
      describe(value),
      `${label} "${String(value)}" is not known; use ${choices.join(', ')}.`,
    );
  }
  return found;
}

/** A value an error can carry: JSON has no undefined, functions or NaN. */
function describe(value: unknown): unknown {
  if (value === undefined) return null;
  if (typeof value === 'number' || typeof value === 'function' || typeof value === 'bigint')
    return String(value);
  return value;
}
