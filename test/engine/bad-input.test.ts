import { describe, expect, it } from 'vitest';
import { evaluate, InputError, wallState, type EvaluationDescription } from '../../shared/engine';
import { description, polyester, vinylAlcohol } from './descriptions';

function refusal(given: unknown): InputError {
  try {
    evaluate(given as EvaluationDescription);
  } catch (error) {
    if (error instanceof InputError) return error;
    throw error;
  }
  throw new Error('This was not refused.');
}

/** A description with one place changed, by its path. */
function changed(path: string, value: unknown, base: unknown = description()): unknown {
  const copy = structuredClone(base) as Record<string, unknown>;
  const keys = path.replace(/\[(\d+)\]/g, '.$1').split('.');
  let place: Record<string, unknown> = copy;
  for (const key of keys.slice(0, -1)) place = place[key] as Record<string, unknown>;
  const last = keys[keys.length - 1];
  if (value === undefined) delete place[last];
  else place[last] = value;
  return copy;
}

const WALL = 'pack.walls[0]';
const curve = `${WALL}.layers[0].oxygen.humidity_curve`;

describe('input that cannot be computed with', () => {
  it.each<[string, unknown]>([
    ['route.legs[0].temperature_C', 60.5],
    ['route.legs[0].temperature_C', -30.1],
    ['route.legs[0].temperature_C', '20'],
    ['route.legs[0].relative_humidity', 1.01],
    ['route.legs[0].relative_humidity', -0.01],
    ['route.legs[0].days', 0],
    ['route.legs[0].days', Number.NaN],
    ['route.legs', []],
    ['route.after_last', 'stop'],
    [`${WALL}.layers`, []],
    [`${WALL}.layers`, Array.from({ length: 200 }, () => polyester)],
    [`${WALL}.layers[0].thickness_um`, 0],
    [`${WALL}.layers[0].thickness_um`, -3],
    [`${WALL}.layers[0].thickness_um`, 1e9],
    [`${WALL}.layers[0].thickness_um`, undefined],
    [`${WALL}.layers[0].kind`, 'paint'],
    [`${WALL}.layers[0].oxygen`, undefined],
    [`${WALL}.layers[0].oxygen.permeability_mol_m_per_m2_s_Pa`, 0],
    [`${WALL}.layers[0].oxygen.reference_relative_humidity`, 1.2],
    [`${WALL}.area_m2`, 0],
    [`${WALL}.area_m2`, Number.POSITIVE_INFINITY],
    ['pack.walls', []],
    ['pack.headspace_cm3', -1],
    ['pack.starting_headspace_oxygen_percent', 101],
    ['food.mass_kg', 0],
    ['food.oxygen_mode', 'sometimes'],
    ['food.inside_relative_humidity', undefined],
    ['food.inside_relative_humidity', 1.5],
    ['horizon_days', 0],
    ['horizon_days', 1_000_001],
    ['total_pressure_Pa', 1000],
    ['absorber_capacity_cm3_STP', -1],
    ['target_days', 0],
    ['limits.oxygen_uptake_mg_per_kg', -5],
  ])('is refused at %s: %s', (path, value) => {
    const error = refusal(changed(path, value));
    expect(error.path).toBe(path);
    expect(error.message).toMatch(/use |give|needed|allowed|missing|number/);
    expect(JSON.stringify({ value: error.value })).toContain('value');
  });

  it.each<[string, unknown, string]>([
    ['unsorted', { relative_humidity: [0.2, 0.8, 0.5], factor: [1, 2, 3] }, `${curve}.relative_humidity[2]`],
    ['doubled', { relative_humidity: [0.2, 0.2], factor: [1, 2] }, `${curve}.relative_humidity[1]`],
    ['uneven', { relative_humidity: [0.2, 0.4], factor: [1] }, `${curve}.factor`],
    ['without a factor above 0', { relative_humidity: [0.2, 0.4], factor: [1, 0] }, `${curve}.factor[1]`],
    ['beyond 1', { relative_humidity: [0.2, 1.4], factor: [1, 2] }, `${curve}.relative_humidity[1]`],
    ['empty', { relative_humidity: [], factor: [] }, `${curve}.relative_humidity`],
  ])('is refused for a humidity curve that is %s', (_what, value, path) => {
    expect(refusal(changed(curve, value)).path).toBe(path);
  });

  it('is refused where one thing needs another', () => {
    const noHeadspace = changed(
      'pack.headspace_cm3',
      0,
      description({ limits: { headspace_oxygen_percent: 2 } }),
    );
    expect(refusal(noHeadspace).path).toBe('limits.headspace_oxygen_percent');
    expect(refusal(description({ food: { oxygen_mode: 'rate' } })).path).toBe(
      'food.rate_constant_mol_per_kg_s_Pa',
    );
    expect(refusal(description({ limits: { moisture_max_g_per_g: 0.1 } })).path).toBe(
      'limits.moisture_max_g_per_g',
    );
    const isotherm = { type: 'linear' as const, slope_g_per_g: 0.2, intercept_g_per_g: 0 };
    expect(refusal(description({ food: { isotherm } })).path).toBe('food.initial_moisture_g_per_g');
    const flat = { type: 'linear' as const, slope_g_per_g: 0, intercept_g_per_g: 0 };
    expect(refusal(description({ food: { isotherm: flat, initial_moisture_g_per_g: 0.1 } })).path).toBe(
      'food.isotherm.slope_g_per_g',
    );
    expect(refusal(description({ report_days: [-1] })).path).toBe('report_days[0]');
    expect(refusal(description({ horizon_days: 10, report_days: [11] })).path).toBe('report_days[0]');
    const short = {
      legs: [{ temperature_C: 20, relative_humidity: 0.5, days: 1e-3 }],
      after_last: 'repeat' as const,
    };
    expect(refusal(description({ route: short })).message).toMatch(/longer legs/);
  });

  it.each([null, undefined, 3, 'pack', [], {}])('is refused, not crashed on: %s', (given) => {
    expect(refusal(given)).toBeInstanceOf(InputError);
  });

  it('is refused in a wall asked for by itself', () => {
    const conditions = {
      temperature_C: 20,
      relative_humidity_outside: 0.5,
      relative_humidity_inside: 0.5,
      oxygen_pressure_outside_Pa: -1,
      oxygen_pressure_inside_Pa: 0,
    };
    expect(() => wallState([vinylAlcohol], conditions)).toThrow(InputError);
    expect(() => wallState([], { ...conditions, oxygen_pressure_outside_Pa: 1 })).toThrow(/at least 1/);
  });
});
