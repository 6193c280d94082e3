import { spawnSync } from 'node:child_process';
import { describe, expect, it } from 'vitest';
import { convert, type UnitName } from '../../shared/units';

/** GNU units as a second opinion: it knows the perm and the gallon, and lets the rest be put together. */
const hasUnits = spawnSync('units', ['--version']).status === 0;

/** `cm3(STP)` is an amount: volume over the molar volume at 0 °C and one atmosphere. */
const CM3_STP = '(cm^3/(gasconstant 273.15 K/atm))';
const WATER = '(18.01528 g/mol)';

const PAIRS: readonly [from: UnitName, to: UnitName, fromInUnits: string, toInUnits: string][] = [
  ['perm_0C', 'ng/(m2*s*Pa)', 'perm_0C', 'ng/(m^2 s Pa)'],
  ['perm_23C', 'ng/(m2*s*Pa)', 'perm_23C', 'ng/(m^2 s Pa)'],
  ['perm', 'perm_23C', 'perm', 'perm_23C'],
  ['metric_perm', 'perm_0C', 'g/(day m^2 mmHg)', 'perm_0C'],
  ['perm_inch', 'kg*m/(m2*s*Pa)', 'perm_0C inch', 'kg m/(m^2 s Pa)'],
  ['perm_0C', 'mol_water/(m2*s*Pa)', `perm_0C/${WATER}`, 'mol/(m^2 s Pa)'],
  ['grain/(h*ft2)', 'g/(m2*day)', 'grain/(hour ft^2)', 'g/(m^2 day)'],
  ['g/(100in2*day)', 'g/(m2*day)', 'g/(100 in^2 day)', 'g/(m^2 day)'],
  ['g*mil/(100in2*day)', 'g*um/(m2*day)', 'g mil/(100 in^2 day)', 'g micron/(m^2 day)'],
  ['g/(m2*day*kPa)', 'kg/(m2*s*Pa)', 'g/(m^2 day kPa)', 'kg/(m^2 s Pa)'],
  ['barrer', 'mol*m/(m2*s*Pa)', `1e-10 ${CM3_STP} cm/(cm^2 s (atm/76))`, 'mol m/(m^2 s Pa)'],
  [
    'cm3(STP)*mil/(100in2*day*atm)',
    'mol*m/(m2*s*Pa)',
    `${CM3_STP} mil/(100 in^2 day atm)`,
    'mol m/(m^2 s Pa)',
  ],
  [
    'cm3(STP)*um/(m2*day*bar)',
    'cm3(STP)*um/(m2*day*atm)',
    'cm^3 micron/(m^2 day bar)',
    'cm^3 micron/(m^2 day atm)',
  ],
  ['cm3(STP)/(m2*day*atm)', 'mol/(m2*s*Pa)', `${CM3_STP}/(m^2 day atm)`, 'mol/(m^2 s Pa)'],
  ['cm3(STP)/(100in2*day)', 'mol/(m2*s)', `${CM3_STP}/(100 in^2 day)`, 'mol/(m^2 s)'],
  ['cm3(STP)', 'umol', CM3_STP, 'micromol'],
  ['mmHg', 'Pa', 'mmHg', 'Pa'],
  ['inHg', 'Pa', 'inHg', 'Pa'],
  ['psi', 'Pa', 'psi', 'Pa'],
  ['mil', 'um', 'mil', 'micron'],
  ['100in2', 'm2', '100 in^2', 'm^2'],
  ['fl_oz', 'cm3', 'usfloz', 'cm^3'],
  ['lb', 'g', 'pound', 'g'],
  ['grain', 'mg', 'grain', 'mg'],
  ['kcal/mol', 'J/mol', 'thermcalorie 1000/mol', 'J/mol'],
];

describe.skipIf(!hasUnits)('against GNU units (skipped where GNU units is not installed)', () => {
  it.each(PAIRS)('1 %s in %s', (from, to, fromInUnits, toInUnits) => {
    const run = spawnSync('units', ['-t', '-d', '15', fromInUnits, toInUnits], { encoding: 'utf8' });
    expect(run.status, run.stdout + run.stderr).toBe(0);
    const theirs = Number(run.stdout.trim());
    expect(theirs).toBeGreaterThan(0);
    expect(Math.abs(convert(1, from, to) - theirs)).toBeLessThanOrEqual(1e-6 * theirs);
  });
});
