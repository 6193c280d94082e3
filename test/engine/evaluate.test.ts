import { describe, expect, it } from 'vitest';
import {
  ENGINE_VERSION,
  evaluate,
  gasFromStated,
  InputError,
  standardTests,
  storage,
  wallInTest,
  wallState,
  type EvaluationAnswer,
  type FilmDescription,
  type StatedGas,
} from '../../shared/engine';
import { fromSi } from '../../shared/units';
import { coatingOf, description, foil, polyester, polyethylene, vinylAlcohol } from './descriptions';

function notFinite(value: unknown, path = ''): string[] {
  if (typeof value === 'number') return Number.isFinite(value) ? [] : [path];
  if (typeof value !== 'object' || value === null) return [];
  return Object.entries(value).flatMap(([key, item]) => notFinite(item, `${path}.${key}`));
}

const codes = (answer: EvaluationAnswer): string[] => answer.warnings.map((warning) => warning.code);

const gab = { type: 'GAB' as const, Xm_g_per_g: 0.055, C: 14, K: 0.86 };

describe('the whole answer', () => {
  const answer = evaluate(
    description({
      layers: [polyester, vinylAlcohol, polyethylene],
      food: { isotherm: gab, initial_moisture_g_per_g: 0.02 },
      route: {
        legs: [
          { name: 'sea', temperature_C: 30, relative_humidity: 0.9, days: 20 },
          { temperature_C: 23, relative_humidity: 0.5, days: 10 },
        ],
        after_last: 'hold',
      },
      limits: { oxygen_uptake_mg_per_kg: 60, moisture_max_g_per_g: 0.06 },
      target_days: 30,
    }),
  );

  it('shows every leg as it begins, with the humidity the food has by then', () => {
    const [wall] = answer.walls;
    expect(answer.engine_version).toBe(ENGINE_VERSION);
    expect(wall.legs.map((leg) => [leg.leg, leg.leg_name, leg.starts_day])).toEqual([
      [0, 'sea', 0],
      [1, undefined, 20],
    ]);
    expect(wall.legs[1].relative_humidity_inside).toBeGreaterThan(wall.legs[0].relative_humidity_inside);
    expect(wall.tests.map((test) => test.test)).toEqual(standardTests);
    expect(answer.pack.map((pack) => pack.starts_day)).toEqual([0, 20]);
  });

  it('measures itself against the target', () => {
    expect(answer.target).toEqual({
      days: 30,
      is_met: (answer.shelf_life_days ?? Infinity) >= 30,
      margin_days: (answer.shelf_life_days ?? Number.NaN) - 30,
    });
  });

  it('says that turning the wall round would matter, with both numbers', () => {
    const warning = answer.warnings.find(({ code }) => code === 'orientation_matters');
    expect(warning?.path).toBe('pack.walls[0].layers');
    expect(warning?.message).toMatch(/%.*more|less.*mol/);
  });

  it('gives the same bytes for the same description', () => {
    const once = description({
      layers: [polyester, vinylAlcohol],
      food: { isotherm: gab, initial_moisture_g_per_g: 0.03 },
    });
    expect(JSON.stringify(evaluate(once))).toBe(JSON.stringify(evaluate(structuredClone(once))));
  });
});

describe('warnings', () => {
  it('name a layer far outside its measured temperatures, or without any', () => {
    const measured = {
      ...polyester,
      oxygen: { ...polyester.oxygen, measured_temperature_min_C: 10, measured_temperature_max_C: 30 },
    };
    const route = {
      legs: [{ temperature_C: 45.5, relative_humidity: 0.5, days: 1 }],
      after_last: 'hold' as const,
    };
    const { warnings } = evaluate(description({ layers: [measured], route }));
    expect(warnings.find(({ code }) => code === 'temperature_outside_measured')?.path).toBe(
      'pack.walls[0].layers[0].oxygen',
    );
    expect(warnings.find(({ code }) => code === 'temperature_range_unknown')?.path).toBe(
      'pack.walls[0].layers[0].water',
    );
    expect(codes(evaluate(description({ layers: [measured] })))).not.toContain('temperature_range_unknown');
  });

  it('name a curve used beyond its last point', () => {
    const short = {
      ...vinylAlcohol,
      oxygen: { ...vinylAlcohol.oxygen, humidity_curve: { relative_humidity: [0, 0.4], factor: [1, 2] } },
    };
    const { warnings } = evaluate(description({ layers: [short] }));
    expect(warnings.find(({ code }) => code === 'humidity_beyond_curve')?.message).toMatch(
      /ethylene vinyl alcohol.*40 %.*50 %/,
    );
  });

  it('say what is estimated, below measuring, already passed, or without an energy', () => {
    const holed = { ...foil, defects: { density_per_m2: 100, diameter_um: 20 } };
    const answer = evaluate(
      description({
        layers: [polyester, holed, polyethylene],
        pack: { starting_headspace_oxygen_percent: 21 },
        food: { oxygen_mode: 'rate', rate_constant_mol_per_kg_s_Pa: 1e-13 },
        limits: { headspace_oxygen_percent: 2 },
      }),
    );
    expect(codes(answer)).toEqual(
      expect.arrayContaining([
        'pinholes_are_estimated',
        'below_measurable',
        'limit_passed_at_packing',
        'rate_constant_without_energy',
      ]),
    );
    expect(answer.shelf_life_days).toBe(0);
    expect(answer.warnings.find(({ code }) => code === 'limit_passed_at_packing')?.message).toMatch(
      /begins at 21 % oxygen, the limit is 2 %/,
    );
    expect(new Set(answer.warnings.map((warning) => JSON.stringify(warning))).size).toBe(
      answer.warnings.length,
    );
  });
});

describe('warnings say', () => {
  it('how much oxygen is in the pack when the limit is passed at closing, and what would do', () => {
    // By hand: 20.9 % of 100 cm³ at 23 °C and 1 atm is 8.600e-4 mol, 27.5 mg; over 0.2 kg 138 mg/kg; 40/138 of 20.9 %.
    const { warnings } = evaluate(
      description({
        pack: { headspace_cm3: 100, starting_headspace_oxygen_percent: 20.9 },
        food: { oxygen_mode: 'at_once', mass_kg: 0.2 },
        limits: { oxygen_uptake_mg_per_kg: 40 },
      }),
    );
    expect(warnings.find(({ code }) => code === 'limit_passed_at_packing')?.message).toMatch(
      /138 mg of oxygen per kg of food, the limit is 40 mg\/kg: flush to below 6.08 % oxygen/,
    );
  });

  it('that a value without activation energy is used unchanged at another temperature', () => {
    const plain = { ...polyester, oxygen: { ...polyester.oxygen, activation_energy_J_per_mol: 0 } };
    const warm = evaluate(
      description({
        layers: [plain],
        route: { legs: [{ temperature_C: 33, relative_humidity: 0.5, days: 10 }], after_last: 'hold' },
      }),
    );
    expect(warm.warnings.find(({ code }) => code === 'activation_energy_missing')?.message).toMatch(
      /23 °C .* at 33 °C/,
    );
    expect(codes(evaluate(description({ layers: [plain] })))).not.toContain('activation_energy_missing');
  });

  it('that a curve is left in a test, and that more passes where it rises', () => {
    const short = {
      ...vinylAlcohol,
      oxygen: { ...vinylAlcohol.oxygen, humidity_curve: { relative_humidity: [0, 0.7], factor: [1, 2] } },
    };
    const { warnings } = evaluate(
      description({
        layers: [short],
        tests: [
          {
            gas: 'oxygen',
            temperature_C: 23,
            relative_humidity_outside: 0.9,
            relative_humidity_inside: 0.9,
            oxygen_mole_fraction_dry: 1,
          },
        ],
      }),
    );
    expect(warnings.find(({ code }) => code === 'humidity_beyond_curve')?.message).toMatch(
      /in the tests the layer sees 90 %.*so more passes than is computed/,
    );
  });
});

describe('extremes', () => {
  const steep = {
    ...vinylAlcohol,
    oxygen: {
      permeability_mol_m_per_m2_s_Pa: 1e-19,
      humidity_curve: { relative_humidity: [0.5, 0.500001], factor: [1, 1e6] },
    },
    water: {
      permeability_mol_m_per_m2_s_Pa: 1e-13,
      humidity_curve: { relative_humidity: [0.4, 0.4000001], factor: [1, 1e5] },
    },
  };
  const moist = { isotherm: gab, initial_moisture_g_per_g: 0.02 };
  const unbound = { isotherm: { ...gab, K: 1 }, initial_moisture_g_per_g: 0.02 };
  const at = (relative_humidity: number) => ({
    legs: [{ temperature_C: 30, relative_humidity, days: 1 }],
    after_last: 'hold' as const,
  });
  const all = { oxygen_uptake_mg_per_kg: 1e5 };
  const fast = { oxygen_mode: 'rate' as const, rate_constant_mol_per_kg_s_Pa: 1 };

  it.each([
    ['perfect foil', description({ layers: [foil], food: moist })],
    ['no headspace', description({ pack: { headspace_cm3: 0 }, food: { ...moist, ...fast } })],
    [
      'a speck of headspace and a fast reaction',
      description({ pack: { headspace_cm3: 1e-6 }, layers: [vinylAlcohol], food: { ...moist, ...fast } }),
    ],
    [
      'food at rest with the air',
      description({ food: { ...moist, initial_moisture_g_per_g: 0.0900009 }, route: at(0.5) }),
    ],
    [
      'dry air',
      description({ layers: [vinylAlcohol, polyethylene], food: moist, route: at(0), limits: all }),
    ],
    [
      'saturated air',
      description({ layers: [vinylAlcohol, polyethylene], food: moist, route: at(1), limits: all }),
    ],
    [
      'saturated air and a moisture without bound',
      description({
        layers: [vinylAlcohol],
        food: unbound,
        route: at(1),
        limits: { moisture_max_g_per_g: 100 },
      }),
    ],
    [
      'layers thin and thick beyond reason',
      description({
        layers: [
          { ...polyester, thickness_um: 1e-9 },
          { ...vinylAlcohol, thickness_um: 1e6 },
          { ...vinylAlcohol, thickness_um: 1e-9 },
        ],
        food: moist,
      }),
    ],
    [
      'curves that are steps',
      description({
        layers: [polyester, steep, polyethylene, steep],
        food: moist,
        route: at(0.95),
        limits: all,
      }),
    ],
    [
      'a milligram of food behind a thin film',
      description({
        layers: [vinylAlcohol],
        food: { ...moist, mass_kg: 1e-6 },
        limits: all,
        horizon_days: 36_500,
      }),
    ],
    ['nothing but a coating', description({ layers: [coatingOf(1)], food: moist, limits: all })],
  ])('%s: finite and finished', (_name, given) => {
    const answer = evaluate(given);
    expect(notFinite(answer)).toEqual([]);
    expect(answer.solver.status).toBe('finished');
    expect(answer.solver.accepted_steps).toBeLessThan(5_000);
  });

  it('ten thousand legs end', () => {
    const legs = Array.from({ length: 10_000 }, (_, i) => ({
      temperature_C: 20 + (i % 7),
      relative_humidity: 0.5 + 0.04 * (i % 9),
      days: 0.5,
    }));
    const answer = evaluate(
      description({
        layers: [polyester, vinylAlcohol, polyethylene],
        food: moist,
        route: { legs, after_last: 'hold' },
        limits: all,
        horizon_days: 5000,
      }),
    );
    expect(notFinite(answer)).toEqual([]);
    expect(answer.solver.status).toBe('finished');
    expect(answer.walls[0].legs).toHaveLength(60);
  });
});

describe('work without end', () => {
  const moist = { isotherm: gab, initial_moisture_g_per_g: 0.02 };
  const repeated = (days: number, walls?: number) =>
    description({
      layers: [polyester, vinylAlcohol, polyethylene],
      ...(walls
        ? {
            pack: {
              walls: Array.from({ length: walls }, () => ({
                name: 'wall',
                area_m2: 0.01,
                layers: Array.from({ length: 20 }, () => vinylAlcohol),
              })),
            },
          }
        : {}),
      food: moist,
      route: {
        legs: [
          { temperature_C: 30, relative_humidity: 0.8, days },
          { temperature_C: 12, relative_humidity: 0.4, days },
        ],
        after_last: 'repeat',
      },
      limits: { oxygen_uptake_mg_per_kg: 1e6 },
      horizon_days: 20_000,
    });

  it('forty thousand repeated legs are followed to the end', () => {
    const { solver, limits } = storage(repeated(0.5));
    expect(solver.status).toBe('finished');
    expect(solver.accepted_steps).toBeGreaterThan(39_000);
    expect(limits.oxygen_uptake_mg_per_kg?.status).toBe('not reached');
  }, 120_000);

  it('is cut short with a word, in storage as in evaluate', () => {
    const { solver } = storage(repeated(0.25, 20));
    expect(solver.status).toBe('step limit reached');
    expect(notFinite(solver)).toEqual([]);
  }, 120_000);
});

describe('values as a data sheet states them', () => {
  const metric = (value: number, more: Partial<StatedGas> = {}) =>
    gasFromStated({
      gas: 'oxygen',
      kind: 'film',
      value,
      unit: 'cm3(STP)*um/(m2*day*atm)',
      temperature_C: 23,
      ...more,
    });
  const water = { permeability_mol_m_per_m2_s_Pa: 5e-14 };

  it.each([
    [0.6, '1.97'],
    [0.8, '15.8'],
    [0.9, '78.2'],
  ])('PET / EVOH / LDPE at %s reads %s cm³/(m²·day·atm)', (humidity, text) => {
    const curved = {
      relative_humidity: 0.6,
      humidity_curve: { relative_humidity: [0.6, 0.8, 0.9], factor: [1, 9, 100] },
    };
    const layer = (name: string, thickness: number, oxygen: FilmDescription['oxygen']): FilmDescription => ({
      kind: 'film',
      name,
      thickness_um: thickness,
      oxygen,
      water,
    });
    const layers = [
      layer('PET', 12, metric(1600) as FilmDescription['oxygen']),
      layer('EVOH', 5, metric(10, curved) as FilmDescription['oxygen']),
      layer('LDPE', 50, metric(177_165) as FilmDescription['oxygen']),
    ];
    const state = wallState(layers, {
      temperature_C: 23,
      relative_humidity_outside: humidity,
      relative_humidity_inside: humidity,
      oxygen_pressure_outside_Pa: 21_000,
      oxygen_pressure_inside_Pa: 0,
    });
    expect(fromSi(state.oxygen.permeance_mol_per_m2_s_Pa, 'cm3(STP)/(m2*day*atm)').toPrecision(3)).toBe(text);
  });

  it('come back when their own test is computed', () => {
    const humidity_curve = { relative_humidity: [0.1, 0.5, 0.85], factor: [1, 3, 25] };
    const stated = gasFromStated({
      gas: 'water',
      kind: 'film',
      value: 800,
      unit: 'g*um/(m2*day)',
      temperature_C: 38,
      relative_humidity_high: 0.9,
      relative_humidity_low: 0,
      humidity_curve,
    });
    const layer = { ...polyester, thickness_um: 20, water: stated } as FilmDescription;
    const test = wallInTest([layer], {
      gas: 'water',
      temperature_C: 38,
      relative_humidity_high: 0.9,
      relative_humidity_low: 0,
    });
    expect(test.rate_g_per_m2_day).toBeCloseTo(40, 9);

    const oxygen = gasFromStated({
      gas: 'oxygen',
      kind: 'coating',
      value: 0.8,
      unit: 'cm3(STP)/(m2*day)',
      temperature_C: 23,
      relative_humidity: 0.5,
      gas_mole_fraction_dry: 1,
    });
    const coat = { ...coatingOf(1), oxygen } as ReturnType<typeof coatingOf>;
    const inTest = wallInTest([coat], standardTests[1]);
    expect(inTest.rate_cm3_STP_per_m2_day).toBeCloseTo(0.8, 12);
  });

  it.each<[string, StatedGas]>([
    [
      'a rate for a film',
      { gas: 'oxygen', kind: 'film', value: 1, unit: 'cm3(STP)/(m2*day)', temperature_C: 23 },
    ],
    [
      'a permeability for a coating',
      { gas: 'oxygen', kind: 'coating', value: 1, unit: 'barrer', temperature_C: 23 },
    ],
    [
      'a water rate without its humidities',
      { gas: 'water', kind: 'coating', value: 1, unit: 'g/(m2*day)', temperature_C: 38 },
    ],
    [
      'an oxygen rate without its gas',
      { gas: 'oxygen', kind: 'coating', value: 1, unit: 'cm3(STP)/(m2*day)', temperature_C: 23 },
    ],
    ['an unknown unit', { gas: 'oxygen', kind: 'film', value: 1, unit: 'buckets', temperature_C: 23 }],
    ['nothing', { gas: 'oxygen', kind: 'film', value: 0, unit: 'barrer', temperature_C: 23 }],
  ])('%s is refused', (_name, stated) => {
    expect(() => gasFromStated(stated)).toThrow(InputError);
  });
});
