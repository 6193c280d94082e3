import type { TypedValue } from '../../../shared/contract/fields';
import {
  displayUnit,
  formatExact,
  fromDisplay,
  parseNumber,
  toDisplay,
  type DisplayKindName,
  type DisplayUnitSystem,
} from '../../../shared/units/format';
import type { UnitName } from '../../../shared/units';

/** Names that the API knows for shown units, where they are not the stored unit. */
const TYPED_UNIT_NAMES: Partial<Record<DisplayKindName, Partial<Record<DisplayUnitSystem, UnitName>>>> = {
  temperature_C: { us_customary: 'F' },
  thickness_um: { us_customary: 'mil' },
  length_mm: { us_customary: 'in' },
  area_m2: { metric: 'cm2', us_customary: 'in2' },
  volume_cm3: { us_customary: 'in3' },
  mass_kg: { metric: 'g', us_customary: 'oz' },
};

/** Blank for an absent value; otherwise as a person would type it: no grouping, a plain minus. */
export function fieldText(
  stored: number | null | undefined,
  kind: DisplayKindName,
  unitSystem: DisplayUnitSystem,
): string {
  if (stored === null || stored === undefined) return '';
  const shown = toDisplay(stored, kind, unitSystem);
  const figures = formatExact(shown);
  return figures.includes('×')
    ? String(Number(shown.toPrecision(6)))
    : figures.replace(/\u00a0/g, '').replace('−', '-');
}

/** The stored value of what stands in a field; NaN for text that is no number, undefined for a blank. */
export function fieldValue(
  text: string,
  kind: DisplayKindName,
  unitSystem: DisplayUnitSystem,
): number | undefined {
  if (text.trim() === '') return undefined;
  return fromDisplay(parseNumber(text), kind, unitSystem);
}

/** Reads the fields of one form: converts, leaves alone what nobody touched, and notes what was typed in which unit. */
export class FieldReader {
  private readonly typedByPath: Record<string, TypedValue> = {};

  constructor(private readonly unitSystem: DisplayUnitSystem) {}

  /** `before` is the stored value that the field was filled from: shown rounded and left alone, it stays exact. */
  read(
    path: string,
    text: string,
    options: { kind: DisplayKindName; before?: number | null },
  ): number | undefined {
    const { kind, before } = options;
    if (before !== null && before !== undefined && text === fieldText(before, kind, this.unitSystem))
      return before;
    const value = fieldValue(text, kind, this.unitSystem);
    const unit = TYPED_UNIT_NAMES[kind]?.[this.unitSystem];
    // Nothing is nothing in any unit, and 32 °F is 0 °C only to the last bit but one.
    if (unit !== undefined && value !== undefined && value !== 0 && Number.isFinite(value)) {
      this.typedByPath[path] = { value: parseNumber(text), unit };
    }
    return value;
  }

  /** As read, where the field must be filled: a blank is NaN, which the schema refuses by name. */
  readRequired(
    path: string,
    text: string,
    options: { kind: DisplayKindName; before?: number | null },
  ): number {
    return this.read(path, text, options) ?? NaN;
  }

  typed(): { typed?: Record<string, TypedValue> } {
    return Object.keys(this.typedByPath).length === 0 ? {} : { typed: this.typedByPath };
  }
}

/** The unit that stands behind a field. */
export function fieldUnit(kind: DisplayKindName, unitSystem: DisplayUnitSystem): string {
  return displayUnit(kind, unitSystem).unit;
}
