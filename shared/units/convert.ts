import { UNITS, type QuantityKind, type Unit, type UnitName } from './unit-table';

/** Thrown for a unit nobody knows, or a pair that does not measure the same thing. */
export class UnitError extends Error {
  readonly fromUnit: string;
  readonly toUnit: string | null;

  constructor(fromUnit: string, toUnit: string | null, message: string) {
    super(message);
    this.name = 'UnitError';
    this.fromUnit = fromUnit;
    this.toUnit = toUnit;
  }
}

function isUnitName(name: string): name is UnitName {
  return Object.prototype.hasOwnProperty.call(UNITS, name);
}

/** The unit of that name; throws UnitError for a name that is none. */
function unitNamed(name: string): Unit {
  if (!isUnitName(name)) throw new UnitError(name, null, `"${name}" is not a unit known here.`);
  return UNITS[name];
}

/** What a unit measures; throws UnitError for a name that is none. */
export function kindOf(name: string): QuantityKind {
  return unitNamed(name).kind;
}

/** Units of one kind, in the order of the table. */
export function unitsOfKind(kind: QuantityKind): UnitName[] {
  return (Object.keys(UNITS) as UnitName[]).filter((name) => UNITS[name].kind === kind);
}

/** A value in the SI unit of its kind. */
export function toSi(value: number, unitName: string): number {
  const unit = unitNamed(unitName);
  return value * unit.factorToSi + (unit.offsetToSi ?? 0);
}

/** A value in the SI unit of its kind, shown in another unit. */
export function fromSi(valueSi: number, unitName: string): number {
  const unit = unitNamed(unitName);
  return (valueSi - (unit.offsetToSi ?? 0)) / unit.factorToSi;
}

/**
 * value [fromUnit] as a number in toUnit.
 * Range: any finite value. Errors: UnitError for an unknown unit, for two units of different kinds (a rate is no
 * permeability) and for a value that is not finite. Cost: two look-ups.
 */
export function convert(value: number, fromUnit: string, toUnit: string): number {
  const from = unitNamed(fromUnit);
  const to = unitNamed(toUnit);
  if (from.kind !== to.kind) {
    throw new UnitError(
      fromUnit,
      toUnit,
      `${fromUnit} is a unit of ${from.kind} and ${toUnit} one of ${to.kind}: they do not convert into each other.`,
    );
  }
  if (typeof value !== 'number' || !Number.isFinite(value)) {
    throw new UnitError(fromUnit, toUnit, `${String(value)} is not a number that can be converted.`);
  }
  if (from === to) return value;
  return fromSi(value * from.factorToSi + (from.offsetToSi ?? 0), toUnit);
}
