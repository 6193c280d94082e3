import { describe, expect, it } from 'vitest';
import { formatQuantity, type DisplayUnitSystem } from '../units/format';
import { testName, type NamedTest } from './test-name';

const show =
  (unitSystem: DisplayUnitSystem) => (value: number, kind: 'temperature_C' | 'fraction_as_percent') =>
    formatQuantity(value, kind, { unitSystem, isExact: true }).text;
const named = (test: NamedTest, unitSystem: DisplayUnitSystem) =>
  testName(test, show(unitSystem)).replaceAll('\u00a0', ' ');

const dry: NamedTest = {
  gas: 'oxygen',
  temperature_C: 23,
  relative_humidity_outside: 0,
  relative_humidity_inside: 0,
  oxygen_mole_fraction_dry: 1,
};

describe('the name of a transmission test', () => {
  it('says its own condition in the reader’s units', () => {
    expect(named(dry, 'us_customary')).toBe('OTR, 73.4 °F, dry both sides');
    expect(named(dry, 'metric')).toBe('OTR, 23 °C, dry both sides');
  });

  it('tells two sides and another gas apart', () => {
    const test: NamedTest = { ...dry, relative_humidity_outside: 0.85, oxygen_mole_fraction_dry: 0.2095 };
    expect(named(test, 'metric')).toBe('OTR, 23 °C, 85 % outside, 0 % inside, in 20.95 % oxygen');
  });

  it('names a water test from moist to dry', () => {
    const test: NamedTest = {
      gas: 'water',
      temperature_C: 38,
      relative_humidity_high: 0.9,
      relative_humidity_low: 0,
    };
    expect(named(test, 'metric')).toBe('WVTR, 38 °C, 90 % to 0 %');
    expect(named({ ...test, moist_side: 'inside' }, 'metric')).toBe(
      'WVTR, 38 °C, 90 % to 0 %, moist side inside',
    );
  });
});
