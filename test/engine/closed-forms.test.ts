import { describe, expect, it } from 'vitest';
import {
  isothermActivity,
  isothermMoisture,
  packConductance,
  saturationPressurePa,
  storage,
  wallState,
} from '../../shared/engine';
import { saturationPressureAtK } from '../../shared/engine/water-vapour';
import { HumidityCurve } from '../../shared/engine/humidity-curve';
import { DAY_S, GAS_CONSTANT, OXYGEN_MOLAR_MASS, WATER_MOLAR_MASS } from '../../shared/units';
import { description, foil, polyester, polyethylene, vinylAlcohol } from './descriptions';

const conditions = {
  temperature_C: 23,
  relative_humidity_outside: 0.9,
  relative_humidity_inside: 0.2,
  oxygen_pressure_outside_Pa: 21_000,
  oxygen_pressure_inside_Pa: 0,
};

function relative(got: number | null | undefined, expected: number): number {
  return Math.abs((got ?? Number.NaN) / expected - 1);
}

describe('saturation pressure', () => {
  it('gives the published check value over ice, 8.94735 Pa at 230 K, colder than is offered', () => {
    expect(relative(saturationPressureAtK(230), 8.94735)).toBeLessThan(1e-6);
  });

  it('meets at the triple point and refuses what lies outside −30 to 60 °C', () => {
    expect(relative(saturationPressurePa(0.00999999), saturationPressurePa(0.01))).toBeLessThan(1e-5);
    expect(() => saturationPressurePa(-30.01)).toThrow(/−?30/);
    expect(() => saturationPressurePa(Number.NaN)).toThrow(/60/);
  });
});

describe('a humidity curve', () => {
  const curve = HumidityCurve.fromPoints([0.1, 0.4, 0.41, 0.9], [1, 3, 200, 2], 0.25);

  it('is 1 at its reference humidity and flat beyond its ends', () => {
    expect(curve.at(0.25)).toBeCloseTo(1, 14);
    expect(curve.at(0)).toBe(curve.at(0.1));
    expect(curve.at(1)).toBe(curve.at(0.9));
  });

  it.each([
    [0, 1],
    [0.05, 0.2],
    [0.3, 0.405],
    [0.4, 0.41],
    [0.95, 0.05],
    [0.2, 1e-9],
  ])('integrates from %s over %s as Simpson does', (from, width) => {
    const knots = [from, ...[0.1, 0.4, 0.41, 0.9].filter((h) => h > from && h < from + width), from + width];
    let sum = 0;
    for (let k = 0; k + 1 < knots.length; k++) {
      const step = (knots[k + 1] - knots[k]) / 2000;
      for (let i = 0; i < 1000; i++) {
        const h = knots[k] + 2 * i * step;
        sum += (step / 3) * (curve.at(h) + 4 * curve.at(h + step) + curve.at(h + 2 * step));
      }
    }
    expect(relative(curve.integral(from, width), sum)).toBeLessThan(1e-8);
  });

  it('finds the rise that lets a flux through', () => {
    for (const parallel of [0, 1e-12, 1e-9]) {
      const span = { own: 1e-10, parallel, startFactor: 0, endFactor: 0 };
      const rise = curve.riseFor(span, 0.2, 3e-10);
      expect(relative(1e-10 * curve.integral(0.2, rise) + parallel * rise, 3e-10)).toBeLessThan(1e-13);
      expect(relative(span.endFactor, curve.at(0.2 + rise))).toBeLessThan(1e-12);
    }
  });
});

describe('layers in series', () => {
  it('add their resistances where nothing depends on humidity', () => {
    const state = wallState([polyester, polyethylene], conditions);
    const water = 1 / (12e-6 / 5.2e-14 + 50e-6 / 4e-14);
    const oxygen = 1 / (12e-6 / 6.6e-18 + 50e-6 / 9.2e-16);
    expect(relative(state.water.permeance_mol_per_m2_s_Pa, water)).toBeLessThan(1e-13);
    expect(relative(state.oxygen.permeance_mol_per_m2_s_Pa, oxygen)).toBeLessThan(1e-13);
  });

  it('lets the same water flux through every layer, by the integral and not the middle value', () => {
    const state = wallState([polyester, vinylAlcohol, polyethylene], conditions);
    const h = state.water.interface_relative_humidity;
    const saturation = saturationPressurePa(23);
    const curve = HumidityCurve.fromPoints([0, 0.5, 0.8, 1], [1, 1.9, 5, 20], 0);
    const through = (saturation * 1.2e-13 * curve.integral(h[2], h[1] - h[2])) / 6e-6;
    expect(relative(through, state.water.flux_mol_per_m2_s)).toBeLessThan(1e-11);
    expect(
      relative((saturation * 5.2e-14 * (h[0] - h[1])) / 12e-6, state.water.flux_mol_per_m2_s),
    ).toBeLessThan(1e-11);
  });

  it('integrates oxygen along the humidity profile', () => {
    const state = wallState([polyester, vinylAlcohol, polyethylene], conditions);
    const h = state.water.interface_relative_humidity;
    const water = HumidityCurve.fromPoints([0, 0.5, 0.8, 1], [1, 1.9, 5, 20], 0);
    const oxygen = HumidityCurve.fromPoints([0, 0.3, 0.6, 0.75, 0.9, 1], [1, 0.8, 1.6, 4, 30, 110], 0);
    const steps = 20_000;
    let above = 0;
    let below = 0;
    for (let i = 0; i < steps; i++) {
      const at = h[2] + ((i + 0.5) / steps) * (h[1] - h[2]);
      above += water.at(at) / oxygen.at(at);
      below += water.at(at);
    }
    const layer = (6e-6 / 5e-20) * (above / below);
    const total = layer + 12e-6 / 6.6e-18 + 50e-6 / 9.2e-16;
    expect(relative(state.oxygen.permeance_mol_per_m2_s_Pa, 1 / total)).toBeLessThan(1e-7);
  });

  it('comes to the limit of equal humidities without a jump', () => {
    const at = (inside: number): number =>
      wallState([polyester, vinylAlcohol, polyethylene], {
        ...conditions,
        relative_humidity_outside: 0.7,
        relative_humidity_inside: inside,
      }).water.permeance_mol_per_m2_s_Pa;
    expect(relative(at(0.7 - 1e-10), at(0.7))).toBeLessThan(1e-8);
    expect(relative(at(0.7 + 1e-10), at(0.7))).toBeLessThan(1e-8);
  });

  it('shares two tight foils evenly and stops everything', () => {
    const state = wallState([polyester, foil, polyethylene, foil], conditions);
    expect(state.oxygen.permeance_mol_per_m2_s_Pa).toBe(0);
    expect(state.oxygen.resistance_share).toEqual([0, 0.5, 0, 0.5]);
    expect(state.water.interface_relative_humidity[1]).toBe(0.9);
  });
});

describe('isotherms', () => {
  it.each([
    [0.055, 14, 0.86],
    [0.1, 0.4, 0.9],
    [0.08, 1, 0.7],
    [0.06, 55, 1],
    [0.05, 2, 0.8],
  ])('GAB %s %s %s goes there and back', (Xm, C, K) => {
    const isotherm = { type: 'GAB' as const, Xm_g_per_g: Xm, C, K };
    const activities = [1e-6, 0.05, 0.3, 0.6, 0.9, 0.99];
    const back = isothermActivity(isotherm, isothermMoisture(isotherm, activities));
    back.forEach((activity, i) => expect(relative(activity, activities[i])).toBeLessThan(1e-10));
  });

  it('holds activity within 0 and 1, and refuses a moisture without bound', () => {
    expect(isothermActivity({ type: 'linear', slope_g_per_g: 0.2, intercept_g_per_g: 0.02 }, [0, 9])).toEqual(
      [0, 1],
    );
    expect(() => isothermMoisture({ type: 'GAB', Xm_g_per_g: 0.05, C: 10, K: 1 }, [1])).toThrow(/no bound/);
  });
});

describe('moisture', () => {
  const isotherm = { type: 'linear' as const, slope_g_per_g: 0.17, intercept_g_per_g: 0.012 };
  const food = { mass_kg: 0.15, oxygen_mode: 'none' as const, isotherm, initial_moisture_g_per_g: 0.028 };
  const route = {
    legs: [{ temperature_C: 30, relative_humidity: 0.75, days: 1 }],
    after_last: 'hold' as const,
  };

  it('follows the closed form of a linear isotherm (Labuza)', () => {
    const given = description({ food, route, limits: { moisture_max_g_per_g: 0.055 } });
    const { total_mol_per_s_Pa: conductance } = packConductance(given.pack, {
      temperature_C: 30,
      relative_humidity_outside: 0.75,
      relative_humidity_inside: 0.1,
    }).water;
    const rest = 0.17 * 0.75 + 0.012;
    const lifetime =
      ((0.15 / 1.028) * 0.17) / (WATER_MOLAR_MASS * conductance * saturationPressurePa(30)) / DAY_S;
    const days = lifetime * Math.log((rest - 0.028) / (rest - 0.055));
    expect(relative(storage(given).shelf_life_days, days)).toBeLessThan(1e-12);
  });

  it('marches to the same days as the closed form when it has to march', () => {
    const closed = description({ food, route, limits: { moisture_max_g_per_g: 0.055 } });
    const barely = {
      ...vinylAlcohol,
      thickness_um: 1e-3,
      water: {
        ...vinylAlcohol.water,
        permeability_mol_m_per_m2_s_Pa: 1e-9,
        humidity_curve: { relative_humidity: [0, 1], factor: [1, 1 + 1e-9] },
      },
    };
    const marched = description({
      food,
      route,
      layers: [polyester, barely, polyethylene],
      limits: { moisture_max_g_per_g: 0.055 },
    });
    expect(relative(storage(marched).shelf_life_days, storage(closed).shelf_life_days ?? 0)).toBeLessThan(
      1e-8,
    );
  });

  it('changes evenly while activity is held at 1, then comes into the isotherm', () => {
    const wet = { ...food, initial_moisture_g_per_g: 0.4 };
    const answer = storage(
      description({ food: wet, route, limits: { moisture_min_g_per_g: 0.25 }, report_days: [1, 2, 3] }),
    );
    const [one, two, three] = answer.courses?.moisture_g_per_g ?? [];
    expect(one - two).toBeCloseTo(two - three, 12);
    expect(answer.limits.moisture_min_g_per_g?.status).toBe('reached');
  });
});

describe('oxygen', () => {
  const route = {
    legs: [{ temperature_C: 23, relative_humidity: 0.5, days: 1 }],
    after_last: 'hold' as const,
  };
  const outside = 0.2095 * (101_325 - 0.5 * saturationPressurePa(23));
  const conductance = packConductance(description().pack, {
    temperature_C: 23,
    relative_humidity_outside: 0.5,
    relative_humidity_inside: 0.3,
  }).oxygen.total_mol_per_s_Pa;

  it('taken up at once grows in proportion to time, from what was packed', () => {
    const starting = (0.015 * 101_325 * 250e-6) / (GAS_CONSTANT * 296.15);
    const limit = (60e-6 * 0.2) / OXYGEN_MOLAR_MASS;
    const days = (limit - starting) / (conductance * outside) / DAY_S;
    expect(relative(storage(description({ route })).shelf_life_days, days)).toBeLessThan(1e-12);
  });

  it('that does not react nears the outside exponentially', () => {
    const given = description({
      route,
      food: { oxygen_mode: 'none' },
      limits: { headspace_oxygen_percent: 12 },
    });
    const decay = (conductance * GAS_CONSTANT * 296.15) / 250e-6;
    const days = Math.log((outside - 0.015 * 101_325) / (outside - 0.12 * 101_325)) / decay / DAY_S;
    expect(relative(storage(given).shelf_life_days, days)).toBeLessThan(1e-12);
  });

  it('is neither made nor lost: behind foil, headspace and food hold what was packed', () => {
    const answer = storage(
      description({
        layers: [foil],
        food: { oxygen_mode: 'rate', rate_constant_mol_per_kg_s_Pa: 3e-13 },
        limits: {},
        horizon_days: 100,
        report_days: [0, 1, 10, 99],
      }),
    );
    const packed = (0.015 * 101_325 * 250e-6) / (GAS_CONSTANT * 296.15);
    answer.courses?.oxygen_uptake_mg_per_kg.forEach((uptake, i) => {
      const inFood = (uptake * 0.2e-6) / OXYGEN_MOLAR_MASS;
      const percent = answer.courses?.headspace_oxygen_percent?.[i] ?? Number.NaN;
      const inHeadspace = ((percent / 100) * 101_325 * 250e-6) / (GAS_CONSTANT * 296.15);
      expect(relative(inFood + inHeadspace, packed)).toBeLessThan(1e-13);
    });
    expect(answer.courses?.headspace_oxygen_percent?.[3]).toBeLessThan(0.01);
  });

  it('taken up fast enough is taken up at once', () => {
    const base = description({
      layers: [polyester, vinylAlcohol, polyethylene],
      food: {
        oxygen_mode: 'rate',
        rate_constant_mol_per_kg_s_Pa: 2e-14,
        isotherm: { type: 'GAB', Xm_g_per_g: 0.055, C: 14, K: 0.86 },
        initial_moisture_g_per_g: 0.02,
      },
      route: { legs: [{ temperature_C: 30, relative_humidity: 0.9, days: 1 }], after_last: 'hold' },
      limits: {},
      horizon_days: 200,
      report_days: [200],
    });
    const inert = storage({ ...base, food: { ...base.food, oxygen_mode: 'at_once' } }).courses;
    const slow = storage({ ...base, food: { ...base.food, rate_constant_mol_per_kg_s_Pa: 1e-9 } }).courses;
    // A reaction fast enough keeps the headspace empty, as taking up at once does.
    expect(relative(slow?.oxygen_uptake_mg_per_kg[0], inert?.oxygen_uptake_mg_per_kg[0] ?? 0)).toBeLessThan(
      1e-4,
    );
  });

  it('settles where it should', () => {
    const settled = (food: Parameters<typeof description>[0] & object): unknown => {
      const answer = storage(
        description({ ...food, limits: { oxygen_uptake_mg_per_kg: 1e6, headspace_oxygen_percent: 99 } }),
      );
      return [answer.limits.oxygen_uptake_mg_per_kg, answer.limits.headspace_oxygen_percent].map((limit) =>
        limit?.status === 'not reached' ? limit.settles_at : limit,
      );
    };
    expect(settled({ food: { oxygen_mode: 'at_once' } })).toEqual([null, 0]);
    expect(settled({ food: { oxygen_mode: 'none' } })).toEqual([0, (100 * outside) / 101_325]);
    const sealed = settled({
      food: { oxygen_mode: 'rate', rate_constant_mol_per_kg_s_Pa: 1e-13 },
      layers: [foil],
    });
    const starting = (0.015 * 101_325 * 250e-6) / (GAS_CONSTANT * 296.15);
    expect((sealed as number[])[0]).toBeCloseTo((starting * OXYGEN_MOLAR_MASS * 1e6) / 0.2, 9);
    expect((sealed as number[])[1]).toBe(0);
  });
});

describe('routes', () => {
  const food = {
    oxygen_mode: 'rate' as const,
    rate_constant_mol_per_kg_s_Pa: 3e-14,
    isotherm: { type: 'GAB' as const, Xm_g_per_g: 0.055, C: 14, K: 0.86 },
    initial_moisture_g_per_g: 0.02,
  };
  const layers = [polyester, vinylAlcohol, polyethylene];
  const leg = { temperature_C: 31, relative_humidity: 0.85 };

  it('do not change when a leg is cut in two', () => {
    const run = (days: number[]): ReturnType<typeof storage> =>
      storage(
        description({
          food,
          layers,
          route: {
            legs: [
              ...days.map((length) => ({ ...leg, days: length })),
              { ...leg, temperature_C: 12, days: 9 },
            ],
            after_last: 'hold',
          },
          limits: { moisture_max_g_per_g: 0.05, oxygen_uptake_mg_per_kg: 40 },
          report_days: [11, 60.5],
        }),
      );
    const whole = run([40]);
    const cut = run([0.3, 13.7, 26]);
    expect(relative(cut.shelf_life_days, whole.shelf_life_days ?? 0)).toBeLessThan(1e-8);
    cut.courses?.oxygen_uptake_mg_per_kg.forEach((value, i) =>
      expect(relative(value, whole.courses?.oxygen_uptake_mg_per_kg[i] ?? 0)).toBeLessThan(1e-8),
    );
  });

  it('let a step of pressure at a change of leg count', () => {
    const inert = description({
      layers: [foil],
      pack: { starting_headspace_oxygen_percent: 2 },
      food: { oxygen_mode: 'none' },
      route: {
        legs: [
          { temperature_C: 0, relative_humidity: 0.5, days: 7 },
          { temperature_C: 30, relative_humidity: 0.5, days: 7 },
        ],
        after_last: 'repeat',
      },
      limits: { headspace_oxygen_percent: 2.1 },
      horizon_days: 100,
    });
    expect(storage(inert).limits.headspace_oxygen_percent).toEqual({ status: 'reached', days: 7 });
  });
});
