import { describe, expect, it } from 'vitest';
import {
  elasticities,
  InputError,
  largestPermeance,
  requiredThickness,
  storage,
  wallInTest,
  wallState,
  type LayerDescription,
  type StorageDescription,
} from '../../shared/engine';
import { findCrossings, narrowCrossing } from '../../shared/engine/find-crossing';
import { coatingOf, description, foil, polyester, polyethylene, vinylAlcohol } from './descriptions';

const LINEAR = { type: 'linear' as const, slope_g_per_g: 0.18, intercept_g_per_g: 0.005 };

const moist = (more: Partial<StorageDescription> = {}): StorageDescription =>
  description({
    food: { isotherm: LINEAR, initial_moisture_g_per_g: 0.03, inside_relative_humidity: undefined },
    route: { legs: [{ temperature_C: 30, relative_humidity: 0.7, days: 1 }], after_last: 'hold' },
    limits: { moisture_max_g_per_g: 0.07 },
    ...more,
  } as Parameters<typeof description>[0]);

describe('elasticities', () => {
  it('of Labuza’s closed form: area −1, dry mass 1, limit X_c/((X_e − X_c) ln …), a layer its share', () => {
    const given = moist();
    const of = [
      'wall_area:0',
      'food_mass',
      'limit:moisture_max_g_per_g',
      'layer_water:0:0',
      'layer_thickness:0:1',
    ];
    const { elasticity, days } = elasticities({ storage: given, limit: 'moisture_max_g_per_g', of });
    const rest = 0.18 * 0.7 + 0.005;
    const { resistance_share: share } = wallState(given.pack.walls[0].layers, {
      temperature_C: 30,
      relative_humidity_outside: 0.7,
      relative_humidity_inside: 0.2,
      oxygen_pressure_outside_Pa: 0,
      oxygen_pressure_inside_Pa: 0,
    }).water;
    const expected = [
      -1,
      1,
      0.07 / ((rest - 0.07) * Math.log((rest - 0.03) / (rest - 0.07))),
      -share[0],
      share[1],
    ];
    expect(days).toBeCloseTo(storage(given).shelf_life_days ?? Number.NaN, 6);
    elasticity.forEach((value, i) => expect(value).toBeCloseTo(expected[i], 5));
  });

  it('of layers in series: each film and coating its share, all together 1', () => {
    const layers: LayerDescription[] = [
      polyester,
      coatingOf(4e-13),
      polyethylene,
      { ...polyester, thickness_um: 30 },
    ];
    const given = description({
      layers,
      pack: { headspace_cm3: 0, starting_headspace_oxygen_percent: 0 },
      horizon_days: 1e6,
    });
    const { elasticity } = elasticities({
      storage: given,
      limit: 'oxygen_uptake_mg_per_kg',
      of: layers.map((_, i) => `layer_oxygen:0:${i}`),
    });
    const { resistance_share: share } = wallState(layers, {
      temperature_C: 23,
      relative_humidity_outside: 0.5,
      relative_humidity_inside: 0.3,
      oxygen_pressure_outside_Pa: 20_000,
      oxygen_pressure_inside_Pa: 0,
    }).oxygen;
    elasticity.forEach((value, i) => expect(value).toBeCloseTo(-share[i], 6));
    expect(elasticity.reduce<number>((sum, value) => sum + (value ?? Number.NaN), 0)).toBeCloseTo(-1, 6);
  });

  it('of the starting oxygen and of a humidity that cannot grow', () => {
    const given = description({ horizon_days: 1e6 });
    const { elasticity } = elasticities({
      storage: given,
      limit: 'oxygen_uptake_mg_per_kg',
      of: ['starting_headspace_oxygen', 'limit:oxygen_uptake_mg_per_kg'],
    });
    // t = (limit − start)/speed, so the two are −start/(limit − start) and limit/(limit − start), which add to 1.
    expect((elasticity[0] ?? 0) + (elasticity[1] ?? 0)).toBeCloseTo(1, 7);
    expect(elasticity[0]).toBeLessThan(0);
    const saturated = moist({
      route: { legs: [{ temperature_C: 30, relative_humidity: 1, days: 1 }], after_last: 'hold' },
    });
    const [atOne] = elasticities({
      storage: saturated,
      limit: 'moisture_max_g_per_g',
      of: ['leg_relative_humidity:0'],
    }).elasticity;
    const ln = (h: number): number => Math.log((0.18 * h + 0.005 - 0.03) / (0.18 * h + 0.005 - 0.07));
    expect(atOne).toBeCloseTo((Math.log(ln(1)) - Math.log(ln(1 - 1e-6))) / 1e-6, 2);
  });

  it('are null where there is nothing to differ by, and refuse what is not there', () => {
    const behindFoil = description({ layers: [foil] });
    const ask = (of: string[], storage = description()) =>
      elasticities({ storage, limit: 'oxygen_uptake_mg_per_kg', of });
    expect(ask(['wall_area:0'], behindFoil)).toEqual({ days: null, elasticity: [null] });
    expect(ask(['wall_area:0'], description({ limits: { oxygen_uptake_mg_per_kg: 1e-3 } }))).toEqual({
      days: 0,
      elasticity: [null],
    });
    const dry = description({
      route: { legs: [{ temperature_C: 23, relative_humidity: 0, days: 1 }], after_last: 'hold' },
    });
    expect(ask(['leg_relative_humidity:0'], dry).elasticity).toEqual([null]);
    for (const name of [
      'wall_area',
      'wall_area:1',
      'layer_oxygen:0:7',
      'limit:moisture_max_g_per_g',
      'tea',
      'food_mass:0',
    ]) {
      expect(() => ask([name])).toThrow(InputError);
    }
    expect(() => ask(['layer_oxygen:0:0'], behindFoil)).toThrow(/foil/);
  });
});

describe('the largest permeance', () => {
  const test = { temperature_C: 23, relative_humidity: 0.5, oxygen_mole_fraction_dry: 1 };

  it('just meets the target when its factor is put to the walls', () => {
    const given = description({ layers: [polyester, polyethylene], limits: { oxygen_uptake_mg_per_kg: 90 } });
    const found = largestPermeance({
      storage: given,
      limit: 'oxygen_uptake_mg_per_kg',
      gas: 'oxygen',
      target_days: 200,
      test,
    });
    expect(found.status).toBe('found');
    const factor = found.factor ?? Number.NaN;
    const scaled = given.pack.walls[0].layers.map((layer) => ({ ...layer })) as (typeof polyester)[];
    scaled.forEach((layer) => {
      layer.oxygen = {
        ...layer.oxygen,
        permeability_mol_m_per_m2_s_Pa: layer.oxygen.permeability_mol_m_per_m2_s_Pa * factor,
      };
    });
    const again = storage({
      ...given,
      pack: { ...given.pack, walls: [{ ...given.pack.walls[0], layers: scaled }] },
    });
    expect(again.shelf_life_days).toBeCloseTo(200, 5);
    const { rate_cm3_STP_per_m2_day: rate } = wallInTest(scaled, {
      gas: 'oxygen',
      temperature_C: 23,
      relative_humidity_outside: 0.5,
      relative_humidity_inside: 0.5,
      oxygen_mole_fraction_dry: 1,
    });
    expect(found.rate_cm3_STP_per_m2_day).toBeCloseTo(rate ?? Number.NaN, 7);
  });

  it('for water gives a water rate, and says when any or no barrier will do', () => {
    const given = moist();
    const ask = (target_days: number, limits = given.limits) =>
      largestPermeance({
        storage: { ...given, limits },
        limit: 'moisture_max_g_per_g',
        gas: 'water',
        target_days,
        test: { temperature_C: 38, relative_humidity_high: 0.9, relative_humidity_low: 0 },
      });
    const days = storage(given).shelf_life_days ?? Number.NaN;
    expect(ask(days).factor).toBeCloseTo(1, 6);
    expect(ask(days / 3).factor).toBeCloseTo(3, 6);
    expect(ask(days).rate_g_per_m2_day).toBeGreaterThan(0);
    expect(ask(100, { moisture_max_g_per_g: 0.5 })).toMatchObject({ status: 'always met', factor: null });
    expect(ask(100, { moisture_max_g_per_g: 0.03 })).toMatchObject({ status: 'never met', factor: null });
    expect(() => ask(-1)).toThrow(InputError);
  });
});

describe('the required thickness', () => {
  it('just meets the target', () => {
    const given = moist();
    const { thickness_um, status, further_crossings } = requiredThickness({
      storage: given,
      limit: 'moisture_max_g_per_g',
      wall: 0,
      layer: 1,
      target_days: 300,
    });
    expect([status, further_crossings]).toEqual(['found', []]);
    const layers = [polyester, { ...polyethylene, thickness_um: thickness_um ?? 0 }];
    const again = storage({ ...given, pack: { ...given.pack, walls: [{ ...given.pack.walls[0], layers }] } });
    expect(again.shelf_life_days).toBeCloseTo(300, 5);
  });

  it('says so where more than one thickness passes the target: sealant behind a barrier that moist air softens', () => {
    const given = description({
      layers: [vinylAlcohol, { ...polyethylene, thickness_um: 20 }],
      pack: { headspace_cm3: 0, starting_headspace_oxygen_percent: 0 },
      food: { inside_relative_humidity: 0.1 },
      route: { legs: [{ temperature_C: 23, relative_humidity: 0.9, days: 1 }], after_last: 'hold' },
      horizon_days: 1e6,
    });
    const days = (um: number): number =>
      storage({
        ...given,
        pack: {
          ...given.pack,
          walls: [{ ...given.pack.walls[0], layers: [vinylAlcohol, { ...polyethylene, thickness_um: um }] }],
        },
      }).shelf_life_days ?? Infinity;
    // Falls while the sealant keeps the barrier moist, rises again once it is a barrier itself.
    expect(days(1)).toBeGreaterThan(days(300));
    expect(days(1e5)).toBeGreaterThan(days(300));
    const answer = requiredThickness({
      storage: given,
      limit: 'oxygen_uptake_mg_per_kg',
      wall: 0,
      layer: 1,
      target_days: days(8),
    });
    expect(answer.status).toBe('always met');
    expect(answer.further_crossings.map(({ meets }) => meets)).toEqual(['below', 'above']);
    expect(answer.further_crossings[0].thickness_um).toBeCloseTo(8, 4);
  });

  it('is refused for what does not scale, and says when no thickness will do', () => {
    const ask = (layers: LayerDescription[], layer: number, target_days = 100) =>
      requiredThickness({
        storage: { ...moist(), pack: { walls: [{ name: 'wall', area_m2: 0.05, layers }] } },
        limit: 'moisture_max_g_per_g',
        wall: 0,
        layer,
        target_days,
      });
    expect(() => ask([polyester, coatingOf(1e-12)], 1)).toThrow(/coating.*Choose a film/);
    expect(() => ask([polyester, foil], 1)).toThrow(/foil/);
    expect(() => ask([polyester], 1)).toThrow(InputError);
    expect(() => ask([polyester, polyethylene], 0.5)).toThrow(/whole/);
    expect(ask([polyester, foil], 0)).toMatchObject({ status: 'always met', thickness_um: null });
    const packedMoist = moist({ limits: { moisture_max_g_per_g: 0.03 } });
    expect(
      requiredThickness({
        storage: packedMoist,
        limit: 'moisture_max_g_per_g',
        wall: 0,
        layer: 0,
        target_days: 9,
      }),
    ).toMatchObject({ status: 'never met', thickness_um: null, days_as_described: 0 });
  });
});

describe('root search', () => {
  it.each<[string, (x: number) => number, number]>([
    ['a straight line', (x) => x - 0.3, 0.3],
    ['a jump', (x) => (x < 0.7123 ? -1 : 1), 0.7123],
    ['a flat cubic', (x) => (x - 0.4) ** 3, 0.4],
    ['an exponential', (x) => Math.exp(20 * x) - 1000, Math.log(1000) / 20],
    ['a line cut off', (x) => Math.max(-0.1, Math.min(0.1, 9 * (x - 0.51))), 0.51],
  ])('%s: within the tolerance, never dearer than halving', (_name, value, root) => {
    const found = narrowCrossing(
      value,
      { below: 0, above: 1, valueBelow: value(0), valueAbove: value(1) },
      1e-10,
    );
    expect(Math.abs(found.above - root)).toBeLessThanOrEqual(1e-10);
    expect(value(found.above)).toBeGreaterThanOrEqual(0);
    expect(found.evaluations).toBeLessThanOrEqual(36);
  });

  it('finds a summit that lies between grid points', () => {
    const value = (x: number): number => 0.01 - (x - 0.5) ** 2;
    const grid = [0, 0.2, 0.38, 0.62, 0.8, 1];
    const found = findCrossings(value, grid, { tolerance: 1e-10, near: 1 });
    expect(found.map(({ isUp }) => isUp)).toEqual([true, false]);
    expect(found[0].at).toBeCloseTo(0.4, 8);
    expect(found[1].at).toBeCloseTo(0.6, 8);
  });
});
