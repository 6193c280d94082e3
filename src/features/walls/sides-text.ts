import { quantity } from '../../../shared/contract/fields';
import { RULES } from '../../../shared/contract/rules';
import type { DisplayKindName, DisplayUnitSystem } from '../../../shared/units/format';
import { faultAsTyped } from '../../api/kept-forms/spec-faults';
import { fieldText, fieldValue } from '../../api/kept-forms/typed-quantity';
import type { SidesOfWall } from './wall-preview';

/** The chosen conditions as they stand in their fields. */
export type SidesText = Record<keyof SidesOfWall, string>;

const FIELDS: Record<keyof SidesOfWall, { label: string; kind: DisplayKindName; min: number; max: number }> =
  {
    temperature_C: {
      label: 'Temperature',
      kind: 'temperature_C',
      min: RULES.temperature.min,
      max: RULES.temperature.max,
    },
    relative_humidity_outside: { label: 'Humidity outside', kind: 'fraction_as_percent', min: 0, max: 1 },
    relative_humidity_inside: { label: 'Humidity inside', kind: 'fraction_as_percent', min: 0, max: 1 },
  };

export const SIDES_FIELDS = Object.keys(FIELDS).filter((name): name is keyof SidesOfWall => name in FIELDS);

export function sidesField(name: keyof SidesOfWall) {
  return FIELDS[name];
}

export function sidesAsText(sides: SidesOfWall, unitSystem: DisplayUnitSystem): SidesText {
  return {
    temperature_C: fieldText(sides.temperature_C, 'temperature_C', unitSystem),
    relative_humidity_outside: fieldText(sides.relative_humidity_outside, 'fraction_as_percent', unitSystem),
    relative_humidity_inside: fieldText(sides.relative_humidity_inside, 'fraction_as_percent', unitSystem),
  };
}

/** undefined where all is well. */
export function sidesFault(
  name: keyof SidesOfWall,
  text: string,
  unitSystem: DisplayUnitSystem,
): string | undefined {
  const { label, kind, min, max } = FIELDS[name];
  const value = fieldValue(text, kind, unitSystem);
  const isGood = quantity({ label, unit: '', min, max }).isValidSync(value);
  return isGood ? undefined : faultAsTyped(`${label}:`, { text, kind, unitSystem, min, max });
}

/** Null while one of the fields holds something else than a number in its range. */
export function sidesFromText(text: SidesText, unitSystem: DisplayUnitSystem): SidesOfWall | null {
  if (SIDES_FIELDS.some((name) => sidesFault(name, text[name], unitSystem) !== undefined)) return null;
  const value = (name: keyof SidesOfWall) => fieldValue(text[name], FIELDS[name].kind, unitSystem) ?? NaN;
  return {
    temperature_C: value('temperature_C'),
    relative_humidity_outside: value('relative_humidity_outside'),
    relative_humidity_inside: value('relative_humidity_inside'),
  };
}
