import { describe, expect, it } from 'vitest';
import { gasFromStated, InputError, type StatedGas } from '../../shared/engine';
import { fromSi, type UnitName } from '../../shared/units';

function film(stated: Omit<StatedGas, 'kind'>, unit: UnitName): number {
  return fromSi(gasFromStated({ ...stated, kind: 'film' }).permeability_mol_m_per_m2_s_Pa, unit);
}

const rate = {
  gas: 'oxygen' as const,
  value: 120,
  unit: 'cm3(STP)/(m2*day)',
  thickness_um: 12,
  temperature_C: 23,
  relative_humidity: 0,
  gas_mole_fraction_dry: 1,
};

describe('a film stated as measured on one gauge', () => {
  it('PET of 12 µm with 120 cm³/(m²·day) has 1440 cm³·µm/(m²·day·atm)', () => {
    expect(film(rate, 'cm3(STP)*um/(m2*day*atm)')).toBeCloseTo(1440, 9);
  });

  it('counts a permeance by its gauge as well', () => {
    const permeance = { ...rate, unit: 'cm3(STP)/(m2*day*atm)', gas_mole_fraction_dry: undefined };
    expect(film(permeance, 'cm3(STP)*um/(m2*day*atm)')).toBeCloseTo(1440, 9);
  });

  it('takes a water rate as 12 times as much per µm', () => {
    const test = {
      gas: 'water' as const,
      temperature_C: 38,
      relative_humidity_high: 0.9,
      relative_humidity_low: 0,
    };
    const measured = film(
      { ...test, value: 8, unit: 'g/(m2*day)', thickness_um: 12 },
      'mol_water*m/(m2*s*Pa)',
    );
    const perMicrometre = film({ ...test, value: 96, unit: 'g*um/(m2*day)' }, 'mol_water*m/(m2*s*Pa)');
    expect(measured / perMicrometre).toBeCloseTo(1, 12);
  });

  it('needs the gauge, and refuses one where the unit holds for any', () => {
    expect(() => gasFromStated({ ...rate, kind: 'film', thickness_um: undefined })).toThrow(
      /Gauge of the film that was measured is missing/,
    );
    const perMicrometre: StatedGas = { ...rate, kind: 'film', unit: 'cm3(STP)*um/(m2*day*atm)' };
    expect(() => gasFromStated(perMicrometre)).toThrow(InputError);
    expect(() => gasFromStated({ ...rate, kind: 'coating' })).toThrow(/leave out the gauge/);
  });
});
