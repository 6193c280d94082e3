import { unitsOfKind, type QuantityKind, type UnitName } from '../../../shared/units';
import type { DisplayUnitSystem } from '../../../shared/units/format';

export type Gas = 'oxygen' | 'water';
export type LayerKind = 'film' | 'coating';

/** Kinds of quantity that say how a gas passes a film (per thickness) or a whole coating. */
const SUITABLE: Record<Gas, Record<LayerKind, QuantityKind[]>> = {
  oxygen: {
    film: ['gas permeability', 'gas transmission rate', 'gas permeance'],
    coating: ['gas permeance', 'gas transmission rate'],
  },
  water: {
    film: [
      'water vapour transmission rate times thickness',
      'water vapour permeability',
      'water vapour transmission rate',
      'water vapour permeance',
    ],
    coating: ['water vapour transmission rate', 'water vapour permeance'],
  },
};

const USUAL: Record<Gas, Record<LayerKind, Record<DisplayUnitSystem, UnitName>>> = {
  oxygen: {
    film: { metric: 'cm3(STP)*um/(m2*day*atm)', us_customary: 'cm3(STP)*mil/(100in2*day*atm)' },
    coating: { metric: 'cm3(STP)/(m2*day*atm)', us_customary: 'cm3(STP)/(100in2*day*atm)' },
  },
  water: {
    film: { metric: 'g*um/(m2*day)', us_customary: 'g*mil/(100in2*day)' },
    coating: { metric: 'g/(m2*day)', us_customary: 'g/(100in2*day)' },
  },
};

export function suitableUnits(gas: Gas, kind: LayerKind): { kind: QuantityKind; units: UnitName[] }[] {
  return SUITABLE[gas][kind].map((quantity) => ({ kind: quantity, units: unitsOfKind(quantity) }));
}

export function isSuitableUnit(gas: Gas, kind: LayerKind, unit: string): boolean {
  return suitableUnits(gas, kind).some((group) => group.units.some((name) => name === unit));
}

export function usualUnit(gas: Gas, kind: LayerKind, unitSystem: DisplayUnitSystem): UnitName {
  return USUAL[gas][kind][unitSystem];
}

const SPOKEN: Partial<Record<UnitName, string>> = {
  perm: 'perm',
  perm_0C: 'perm (0 °C)',
  perm_23C: 'perm (23 °C)',
  metric_perm: 'metric perm',
  perm_inch: 'perm·inch',
  'mol_water/(m2*s*Pa)': 'mol/(m²·s·Pa)',
  'mol_water*m/(m2*s*Pa)': 'mol·m/(m²·s·Pa)',
  '1e-13cm3(STP)*cm/(cm2*s*Pa)': '10⁻¹³ cm³(STP)·cm/(cm²·s·Pa)',
};

/** A unit as it is printed: 'cm³(STP)·µm/(m²·day·atm)'. */
export function unitInPrint(unit: string): string {
  const spoken = (SPOKEN as Partial<Record<string, string>>)[unit];
  if (spoken !== undefined) return spoken;
  return unit
    .replace(/cm3/g, 'cm³')
    .replace(/cm2/g, 'cm²')
    .replace(/100in2/g, '100 in²')
    .replace(/in2/g, 'in²')
    .replace(/ft2/g, 'ft²')
    .replace(/m2/g, 'm²')
    .replace(/(\d+)um/g, '$1 µm')
    .replace(/um/g, 'µm')
    .replace(/\*/g, '·');
}

/** Whether a film's value in this unit holds only for the gauge that was measured, so that the gauge must be told. */
export function needsGauge(gas: Gas, kind: LayerKind, unit: string): boolean {
  return kind === 'film' && isSuitableUnit(gas, 'coating', unit);
}

/** Whether a unit is a rate in a test, so that the test's two sides must be told. */
export function isRate(gas: Gas, unit: string): boolean {
  const kinds: QuantityKind[] =
    gas === 'oxygen'
      ? ['gas transmission rate']
      : ['water vapour transmission rate', 'water vapour transmission rate times thickness'];
  return kinds.some((kind) => unitsOfKind(kind).some((name) => name === unit));
}
