import { describe, expect, it } from 'vitest';
import {
  formatExact,
  formatNumber,
  formatQuantity,
  fromDisplay,
  parseNumber,
  toDisplay,
} from '../../shared/units/format';

describe('formatNumber', () => {
  it.each([
    [1.9693, '1.97'],
    [15.79, '15.8'],
    [78.2337, '78.2'],
    [515.2, '515'],
    [999.7, '1000'],
    [0.0999999, '0.100'],
    [12_345, '12\u00a0300'],
    [0, '0'],
    [-3.14159, '−3.14'],
    [0.000032, '3.20×10⁻⁵'],
    [6.5e9, '6.50×10⁹'],
  ])('%s reads %s', (value, text) => {
    expect(formatNumber(value)).toBe(text);
  });

  it('never prints NaN', () => {
    expect(formatNumber(NaN)).toBe('–');
    expect(formatNumber(Infinity)).toBe('–');
  });
});

describe('formatExact', () => {
  it.each([
    [12, '12'],
    [2.5, '2.5'],
    [177_165, '177\u00a0165'],
    [0.25, '0.25'],
  ])('%s stays %s', (value, text) => {
    expect(formatExact(value)).toBe(text);
  });
});

describe('unit systems', () => {
  it('shows the SI permeance of 1 cm³/(m²·day·atm) in both (factor: domain table of conversions, GNU units)', () => {
    const si = 5.09625168e-15;
    expect(toDisplay(si, 'oxygen_permeance_mol_per_m2_s_Pa', 'metric')).toBeCloseTo(1, 7);
    expect(toDisplay(si, 'oxygen_permeance_mol_per_m2_s_Pa', 'us_customary')).toBeCloseTo(1 / 15.500031, 7);
  });

  it('shows 1 g/(m²·day) at 38 °C 90 % as 0.0338874 perm (GNU units perm_0C, IAPWS pressure)', () => {
    const si = 1 / 18.01528 / 86_400 / 5969.65554492;
    expect(toDisplay(si, 'water_permeance_mol_per_m2_s_Pa', 'us_customary')).toBeCloseTo(0.0338874, 6);
  });

  it('gives back what was typed', () => {
    for (const typed of [0.48, 1, 2.3, 99.9]) {
      expect(
        toDisplay(fromDisplay(typed, 'thickness_um', 'us_customary'), 'thickness_um', 'us_customary'),
      ).toBeCloseTo(typed, 10);
    }
    expect(fromDisplay(100, 'temperature_C', 'us_customary')).toBeCloseTo(37.7777777778, 9);
  });

  it('shows a given value in full, and a converted one in three figures', () => {
    const options = { isExact: true } as const;
    expect(formatQuantity(0.7435, 'area_m2', { ...options, unitSystem: 'metric' }).text).toBe(
      '7435\u00a0cm²',
    );
    expect(formatQuantity(12, 'thickness_um', { ...options, unitSystem: 'us_customary' }).text).toBe(
      '0.472\u00a0mil',
    );
  });

  it('keeps figures and unit together', () => {
    expect(formatQuantity(25, 'temperature_C', { unitSystem: 'us_customary' }).text).toBe('77.0\u00a0°F');
  });
});

describe('parseNumber', () => {
  it.each([
    ['1,5', 1.5],
    ['0,500', 0.5],
    ['1,50', 1.5],
    ['1.5', 1.5],
    ['−3', -3],
    ['177 165', 177_165],
    ['2e-3', 0.002],
  ])('reads %s', (text, value) => {
    expect(parseNumber(text)).toBe(value);
  });

  it.each(['', 'abc', '1,500', '-12,345', '1,2,3', '1.2.3', 'NaN', 'Infinity', '0x10'])(
    'refuses %s',
    (text) => {
      expect(parseNumber(text)).toBeNaN();
    },
  );
});
