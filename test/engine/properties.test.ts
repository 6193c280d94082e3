import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { storage, wallState, type LayerDescription } from '../../shared/engine';
import { convert, UNITS, unitsOfKind, type UnitName } from '../../shared/units';
import { description, foil } from './descriptions';
import { conditions, decades, humidity, layers, near, number } from './property-inputs';

const RUNS = { numRuns: 1000 };
const SLOW = 120_000;

describe('a wall', () => {
  it(
    'shares its resistance out completely and falls one way through the stair',
    () => {
      fc.assert(
        fc.property(layers, conditions, (wall, at) => {
          const { water, oxygen } = wallState(wall, at);
          for (const { resistance_share: shares } of [water, oxygen]) {
            expect(shares.every((share) => share >= 0)).toBe(true);
            expect(
              near(
                shares.reduce((sum, share) => sum + share, 0),
                1,
                1e-12,
              ),
            ).toBe(true);
          }
          const falls = Math.sign(at.relative_humidity_inside - at.relative_humidity_outside);
          water.interface_relative_humidity.forEach((value, i, all) => {
            if (i > 0) expect((value - all[i - 1]) * falls).toBeGreaterThanOrEqual(-1e-15);
          });
        }),
        RUNS,
      );
    },
    SLOW,
  );

  it(
    'turned round in turned-round air is the same wall',
    () => {
      fc.assert(
        fc.property(layers, conditions, (wall, at) => {
          const as = wallState(wall, at);
          const turned = wallState([...wall].reverse(), {
            ...at,
            relative_humidity_outside: at.relative_humidity_inside,
            relative_humidity_inside: at.relative_humidity_outside,
          });
          expect(near(as.water.permeance_mol_per_m2_s_Pa, turned.water.permeance_mol_per_m2_s_Pa, 1e-9)).toBe(
            true,
          );
          expect(
            near(as.oxygen.permeance_mol_per_m2_s_Pa, turned.oxygen.permeance_mol_per_m2_s_Pa, 1e-8),
          ).toBe(true);
        }),
        RUNS,
      );
    },
    SLOW,
  );

  it(
    'does not change when a layer is cut in two',
    () => {
      fc.assert(
        fc.property(layers, conditions, number(0.05, 0.95), (wall, at, part) => {
          const [first, ...others] = wall;
          const cut: LayerDescription[] = [
            { ...first, thickness_um: first.thickness_um * part },
            { ...first, thickness_um: first.thickness_um * (1 - part) },
            ...others,
          ];
          const whole = wallState(wall, at);
          const parts = wallState(cut, at);
          expect(
            near(whole.water.permeance_mol_per_m2_s_Pa, parts.water.permeance_mol_per_m2_s_Pa, 1e-9),
          ).toBe(true);
          expect(
            near(whole.oxygen.permeance_mol_per_m2_s_Pa, parts.oxygen.permeance_mol_per_m2_s_Pa, 1e-8),
          ).toBe(true);
        }),
        RUNS,
      );
    },
    SLOW,
  );

  it(
    'lets nothing through once a whole foil lies in it',
    () => {
      fc.assert(
        fc.property(layers, conditions, (wall, at) => {
          const { water, oxygen } = wallState([...wall, foil], at);
          expect([water.flux_mol_per_m2_s, oxygen.flux_mol_per_m2_s].map(Math.abs)).toEqual([0, 0]);
        }),
        RUNS,
      );
    },
    SLOW,
  );
});

describe('a pack on its way', () => {
  const moist = fc.record({
    wall: layers,
    mass: number(0.05, 2),
    from: number(0.01, 0.2),
    mode: fc.constantFrom('at_once' as const, 'none' as const, 'rate' as const),
    legs: fc.array(
      fc.record({ temperature_C: number(-30, 60), relative_humidity: humidity, days: number(0.5, 60) }),
      { minLength: 1, maxLength: 4 },
    ),
  });
  type Moist = typeof moist extends fc.Arbitrary<infer Value> ? Value : never;

  const given = ({ wall, mass, from, mode, legs }: Moist, scale = 1) =>
    description({
      pack: {
        walls: [{ name: 'wall', area_m2: 0.05 * scale, layers: wall }],
        headspace_cm3: 200 * scale,
        starting_headspace_oxygen_percent: 1,
      },
      food: {
        mass_kg: mass * scale,
        oxygen_mode: mode,
        ...(mode === 'rate' ? { rate_constant_mol_per_kg_s_Pa: 1e-13 } : {}),
        isotherm: { type: 'GAB', Xm_g_per_g: 0.06, C: 12, K: 0.85 },
        initial_moisture_g_per_g: from,
        inside_relative_humidity: undefined,
      },
      route: { legs, after_last: 'hold' },
      limits: { oxygen_uptake_mg_per_kg: 80, moisture_max_g_per_g: 0.25, moisture_min_g_per_g: 0.005 },
      horizon_days: 500,
      report_days: [3, 77, 499],
    });

  it(
    'lives as long when everything is twice as large',
    () => {
      fc.assert(
        fc.property(moist, (pack) => {
          const one = storage(given(pack));
          const two = storage(given(pack, 2));
          expect(two.first_limit).toBe(one.first_limit);
          if (one.shelf_life_days)
            expect(near(two.shelf_life_days ?? 0, one.shelf_life_days, 1e-9)).toBe(true);
          two.courses?.moisture_g_per_g?.forEach((value, i) =>
            expect(near(value, one.courses?.moisture_g_per_g?.[i] ?? Number.NaN, 1e-9)).toBe(true),
          );
        }),
        RUNS,
      );
    },
    SLOW,
  );

  it(
    'only gains uptake, and keeps moisture between where it began and the air it met',
    () => {
      fc.assert(
        fc.property(moist, (pack) => {
          const { courses } = storage(given(pack));
          const uptake = courses?.oxygen_uptake_mg_per_kg ?? [];
          uptake.forEach((value, i) =>
            expect(value).toBeGreaterThanOrEqual(i > 0 ? uptake[i - 1] * (1 - 1e-12) : 0),
          );
          courses?.moisture_g_per_g?.forEach((value) =>
            expect(Number.isFinite(value) && value >= 0).toBe(true),
          );
        }),
        RUNS,
      );
    },
    SLOW,
  );
});

describe('units', () => {
  const names = Object.keys(UNITS) as UnitName[];

  it('convert there and back within a kind, and never between kinds', () => {
    fc.assert(
      fc.property(fc.constantFrom(...names), fc.constantFrom(...names), decades(-6, 6), (from, to, value) => {
        if (UNITS[from].kind !== UNITS[to].kind) {
          expect(() => convert(value, from, to)).toThrow(/do not convert/);
          return;
        }
        // A temperature loses the digits that 273.15 takes up.
        const allowed = UNITS[from].kind === 'temperature' ? 1e-12 * (Math.abs(value) + 500) : 1e-12 * value;
        expect(Math.abs(convert(convert(value, from, to), to, from) - value)).toBeLessThanOrEqual(allowed);
      }),
      { numRuns: 1000 },
    );
  });

  it('are found by kind', () => {
    expect(unitsOfKind('temperature')).toEqual(['K', 'C', 'F']);
    expect(convert(100, 'F', 'C')).toBeCloseTo(37.7778, 4);
    expect(convert(1, 'mil', 'um')).toBeCloseTo(25.4, 12);
    expect(() => convert(1, 'toString', 'um')).toThrow(/not a unit/);
    expect(() => convert(Number.NaN, 'mil', 'um')).toThrow(/not a number/);
  });
});
