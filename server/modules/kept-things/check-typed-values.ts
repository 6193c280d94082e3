import { convert, UnitError } from '../../../shared/units';
import type { FieldFault } from '../../../shared/errors/error-code';
import { inputInvalid } from '../../http/app-error';

/** A stored number names its unit in its key; these are the units by that ending, longest first. */
const UNIT_BY_ENDING: readonly (readonly [ending: string, unit: string])[] = [
  ['_cm3_STP', 'cm3(STP)'],
  ['_J_per_mol', 'J/mol'],
  ['_g_per_g', 'fraction'],
  ['_percent', 'percent'],
  ['relative_humidity', 'fraction'],
  ['_days', 'day'],
  ['.days', 'day'],
  ['_cm3', 'cm3'],
  ['_um', 'um'],
  ['_mm', 'mm'],
  ['_m2', 'm2'],
  ['_kg', 'kg'],
  ['_Pa', 'Pa'],
  ['_C', 'C'],
];
const TOLERANCE = 1e-9;

interface TypedValue {
  value: number;
  unit: string;
}

/** What was typed must be what is stored: each typed value converts to the number at its path. */
export function checkTypedValues(spec: { typed?: Record<string, TypedValue> | undefined }): void {
  const faults = Object.entries(spec.typed ?? {}).flatMap(
    ([path, typed]) => faultOf(spec, path, typed) ?? [],
  );
  if (faults.length > 0) throw inputInvalid(faults);
}

function faultOf(spec: object, path: string, typed: TypedValue): FieldFault | undefined {
  const fault = (message: string): FieldFault => ({
    path: `spec.typed["${path}"]`,
    value: typed.value,
    message,
  });
  const stored = valueAt(spec, path);
  if (typeof stored !== 'number') return fault(`There is no number at ${path}.`);
  const unit = storedUnitAt(path);
  if (unit === undefined) return fault(`What is stored at ${path} has no other unit; leave it out here.`);
  let converted: number;
  try {
    converted = convert(typed.value, typed.unit, unit);
  } catch (error) {
    if (error instanceof UnitError) return fault(error.message);
    throw error;
  }
  // 32 °F is 0 °C but for rounding: a temperature is compared on the scale of a degree.
  const floor = unit === 'C' ? 1 : 1e-12;
  const isSame = Math.abs(converted - stored) <= TOLERANCE * Math.max(Math.abs(stored), floor);
  return isSame
    ? undefined
    : {
        ...fault(`${typed.value} ${typed.unit} is ${converted} ${unit}, not ${stored}.`),
        path: `spec.${path}`,
      };
}

/** `_mg_per_kg` is no `_kg`: a key that says "per" counts only where its whole ending is listed. */
function storedUnitAt(path: string): string | undefined {
  const found = UNIT_BY_ENDING.find(([ending]) => path.endsWith(ending));
  if (found === undefined) return undefined;
  const [ending, unit] = found;
  const key = path.slice(path.lastIndexOf('.') + 1);
  return key.includes('_per_') && !ending.includes('_per_') ? undefined : unit;
}

/** The value at a path such as `layers[0].thickness_um`; own keys only. */
function valueAt(spec: object, path: string): unknown {
  const steps = path.split(/[.[\]]+/).filter((step) => step !== '');
  return steps.reduce<unknown>(
    (value, step) =>
      typeof value === 'object' && value !== null && Object.hasOwn(value, step)
        ? Object.getOwnPropertyDescriptor(value, step)?.value
        : undefined,
    spec,
  );
}
