import { describe, expect, it } from 'vitest';
import type { FilmMaterialSpec } from '../../../shared/contract/materials';
import { curveInMode, type GasFormValues } from './gas-form-values';
import {
  gaugesFrom,
  materialFormValues,
  materialSpecFrom,
  validateMaterialForm,
  type MaterialFormValues,
} from './material-form-values';

const context = { unitSystem: 'metric' as const, before: null };

function evoh(changes: (values: MaterialFormValues) => void = () => undefined): MaterialFormValues {
  const values = materialFormValues(context);
  values.name = 'EVOH';
  values.material_class = 'humidity-sensitive barrier';
  values.oxygen = {
    ...values.oxygen,
    stated: { ...values.oxygen.stated, value: '10', relative_humidity: '60' },
    curve_mode: 'values',
    curve: [
      { key: 'a', relative_humidity: '60', amount: '10' },
      { key: 'b', relative_humidity: '80', amount: '90' },
      { key: 'c', relative_humidity: '90', amount: '1000' },
    ],
  };
  values.water = { ...values.water, stated: { ...values.water.stated, value: '1500' } };
  changes(values);
  return values;
}

describe('the material form', () => {
  it('takes values at humidities as factors of the stated one', () => {
    expect(validateMaterialForm(context)(evoh())).toEqual({});
    const spec = materialSpecFrom(evoh(), context) as FilmMaterialSpec;
    expect(spec.oxygen.stated.humidity_curve).toEqual({
      relative_humidity: [0.6, 0.8, 0.9],
      factor: [1, 9, 100],
    });
    expect(spec.oxygen.gas.reference_relative_humidity).toBe(0.6);
    // 1 cm³(STP)·µm/(m²·day·atm) is 5.09625e-21 mol·m/(m²·s·Pa).
    expect(spec.oxygen.gas.permeability_mol_m_per_m2_s_Pa / 10).toBeCloseTo(5.09625e-21, 25);
  });

  it('comes back as it was saved', () => {
    const spec = materialSpecFrom(evoh(), context);
    const again = materialFormValues({ unitSystem: 'metric', before: spec });
    expect(materialSpecFrom(again, { unitSystem: 'metric', before: spec })).toEqual(spec);
  });

  it('says what is wrong where it is wrong', () => {
    const wrong = evoh((values) => {
      values.oxygen.stated.value = 'ten';
      values.water.stated.relative_humidity_low = '95';
      values.oxygen.curve[1]!.relative_humidity = '50';
      values.oxygen.curve_mode = 'factors';
    });
    const errors = validateMaterialForm(context)(wrong);
    expect(errors.oxygen?.stated).toMatchObject({
      value: expect.stringContaining('“ten” is no number') as string,
    });
    expect(errors.oxygen?.curve_mode).toContain('rising humidity');
    expect(errors.water?.stated).toMatchObject({
      relative_humidity_low: expect.stringContaining('drier') as string,
    });
  });

  it('refuses a material without a value', () => {
    const errors = validateMaterialForm(context)(evoh((values) => (values.oxygen.stated.value = '')));
    expect(errors.oxygen?.stated).toMatchObject({
      value: expect.stringContaining('enter a number') as string,
    });
  });

  it('takes a film as its data sheet prints it, measured on 12 µm', () => {
    const asPrinted = evoh((values) => {
      values.oxygen = {
        ...values.oxygen,
        curve_mode: 'none',
        curve: [],
        stated: {
          ...values.oxygen.stated,
          value: '120',
          unit: 'cm3(STP)/(m2*day)',
          thickness_um: '12',
          relative_humidity: '0',
        },
      };
      values.water.stated = {
        ...values.water.stated,
        value: '8',
        unit: 'g/(m2*day)',
        thickness_um: '12',
      };
    });
    expect(validateMaterialForm(context)(asPrinted)).toEqual({});
    const spec = materialSpecFrom(asPrinted, context) as FilmMaterialSpec;
    expect(spec.oxygen.stated).toMatchObject({ value: 120, thickness_um: 12, relative_humidity: 0 });
    expect(spec.oxygen.gas.permeability_mol_m_per_m2_s_Pa / 1440).toBeCloseTo(5.09625e-21, 25);
    expect(materialFormValues({ unitSystem: 'metric', before: spec }).water.stated.thickness_um).toBe('12');

    asPrinted.oxygen.stated.thickness_um = '';
    expect(validateMaterialForm(context)(asPrinted).oxygen?.stated).toEqual({
      thickness_um: 'Oxygen, measured on: enter a number, more than 0 and at most 2000 µm.',
    });
  });

  it('asks a new material at which humidity its oxygen value was measured', () => {
    const errors = validateMaterialForm(context)(
      evoh((values) => (values.oxygen.stated.relative_humidity = '')),
    );
    expect(errors.oxygen?.stated).toMatchObject({
      relative_humidity: expect.stringContaining('both sides at: enter the humidity') as string,
    });
    expect(materialFormValues(context).oxygen.stated.relative_humidity).toBe('');
  });

  it('names each field as the page does, and says what to do', () => {
    const errors = validateMaterialForm(context)(
      evoh((values) => {
        values.oxygen.stated.value = '';
        values.oxygen.stated.temperature_C = '';
        values.water.stated.value = '0';
        values.water.stated.relative_humidity_low = '90';
      }),
    );
    expect(errors.oxygen?.stated).toEqual({
      value: 'Oxygen value: enter a number above 0.',
      temperature_C: 'Oxygen, measured at: enter a number, -30 to 60 °C.',
    });
    expect(errors.water?.stated).toEqual({
      value: 'Water value: 0 does not fit; use a number above 0.',
      relative_humidity_low: 'The dry side must be drier than the moist side.',
    });
  });

  it('reads gauges with a decimal comma as well', () => {
    expect(gaugesFrom('12; 15, 23 6,3')).toEqual([12, 15, 23, 6.3]);
  });
});

describe('curveInMode', () => {
  it('says the same curve the other way', () => {
    const values: GasFormValues = evoh().oxygen;
    const factors = curveInMode(values, 'factors', 'metric');
    expect(factors?.map((row) => row.amount)).toEqual(['1', '9', '100']);
    const back = curveInMode({ ...values, curve_mode: 'factors', curve: factors ?? [] }, 'values', 'metric');
    expect(back?.map((row) => row.amount)).toEqual(['10', '90', '1000']);
  });
});
