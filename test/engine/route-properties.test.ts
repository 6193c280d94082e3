import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  isothermActivity,
  packConductance,
  saturationPressurePa,
  storage,
  type LayerDescription,
  type LegDescription,
  type StorageDescription,
} from '../../shared/engine';
import { GAS_CONSTANT, OXYGEN_MOLAR_MASS, WATER_MOLAR_MASS } from '../../shared/units';
import { description, polyester, polyethylene, vinylAlcohol } from './descriptions';
import { layers, near, number, plainLayers } from './property-inputs';

const RUNS = { numRuns: 1000 };
/** What a run promises; two runs that divide their steps differently can agree no better for certain. */
const PROMISED = 1e-6;
const SLOW = 180_000;
const GAB = { type: 'GAB' as const, Xm_g_per_g: 0.055, C: 14, K: 0.86 };

const leg: fc.Arbitrary<LegDescription> = fc.record({
  temperature_C: number(-25, 45),
  relative_humidity: number(0.05, 0.95),
  days: number(1, 20),
});
const legs = fc.array(leg, { minLength: 1, maxLength: 5 });
const held = (list: LegDescription[]): StorageDescription['route'] => ({ legs: list, after_last: 'hold' });
const total = (list: LegDescription[]): number => list.reduce((sum, { days }) => sum + days, 0);
const at = (relative_humidity: number, temperature_C = 25): StorageDescription['route'] =>
  held([{ temperature_C, relative_humidity, days: 1 }]);
const daysOf = (given: StorageDescription): number => storage(given).shelf_life_days ?? Infinity;

/** Twice the moles of oxygen in a mg/kg, and so on: what the report's units hold in SI. */
const uptakeMol = (mgPerKg: number, massKg: number): number => (mgPerKg * 1e-6 * massKg) / OXYGEN_MOLAR_MASS;

describe('nothing is lost on the way', () => {
  it(
    'oxygen: what came in is in the headspace and the food, to 1e-9',
    () => {
      // Constant conductances: entered = Σ K(p_out t − ∫p_in), and ∫p_in = uptake/(k m) of that leg.
      fc.assert(
        fc.property(plainLayers, legs, number(0.05, 1), number(-15, -12), (wall, route, mass, power) => {
          const k = 10 ** power;
          const ends = route.map((_, i) => total(route.slice(0, i + 1)));
          const given = description({
            layers: wall,
            food: {
              mass_kg: mass,
              oxygen_mode: 'rate',
              rate_constant_mol_per_kg_s_Pa: k,
              inside_relative_humidity: 0.4,
            },
            route: held(route),
            limits: {},
            horizon_days: ends[ends.length - 1],
            report_days: [0, ...ends],
          });
          const { courses } = storage(given);
          const uptake = (courses?.oxygen_uptake_mg_per_kg ?? []).map((value) => uptakeMol(value, mass));
          const percent = courses?.headspace_oxygen_percent ?? [];
          const moles = (value: number, celsius: number): number =>
            ((value / 100) * 101_325 * 250e-6) / (GAS_CONSTANT * (celsius + 273.15));
          let offered = 0;
          let returned = 0;
          route.forEach(({ temperature_C, relative_humidity, days }, i) => {
            const conductance = packConductance(given.pack, {
              temperature_C,
              relative_humidity_outside: relative_humidity,
              relative_humidity_inside: 0.4,
            }).oxygen.total_mol_per_s_Pa;
            const outside = 0.2095 * (101_325 - relative_humidity * saturationPressurePa(temperature_C));
            offered += conductance * outside * days * 86_400;
            returned += (conductance / (k * mass)) * (uptake[i + 1] - uptake[i]);
          });
          const last = percent.length - 1;
          const held0 = moles(percent[0], route[0].temperature_C);
          const heldNow = moles(percent[last], route[route.length - 1].temperature_C);
          const lost = heldNow - held0 + uptake[last] - uptake[0] + returned - offered;
          expect(Math.abs(lost)).toBeLessThanOrEqual(1e-9 * (held0 + heldNow + uptake[last] + offered));
        }),
        RUNS,
      );
    },
    SLOW,
  );

  it(
    'oxygen: an absorber and the food share what a food alone takes, behind humid walls too',
    () => {
      fc.assert(
        fc.property(layers, legs, number(0.2, 20), (wall, route, capacity) => {
          const given = description({
            layers: wall,
            food: {
              oxygen_mode: 'at_once',
              isotherm: GAB,
              initial_moisture_g_per_g: 0.03,
              inside_relative_humidity: undefined,
            },
            route: held(route),
            limits: {},
            horizon_days: total(route) + 10,
            report_days: [total(route) + 10],
          });
          const alone = storage(given).courses;
          const shared = storage({ ...given, absorber_capacity_cm3_STP: capacity }).courses;
          const toMol = (cm3: number): number => (cm3 * 101_325e-6) / (GAS_CONSTANT * 273.15);
          const food = uptakeMol(shared?.oxygen_uptake_mg_per_kg[0] ?? Number.NaN, 0.2);
          const absorbed = toMol(capacity - (shared?.absorber_left_cm3_STP?.[0] ?? Number.NaN));
          const all = uptakeMol(alone?.oxygen_uptake_mg_per_kg[0] ?? Number.NaN, 0.2);
          expect(Math.abs(food + absorbed - all)).toBeLessThanOrEqual(PROMISED * all + 1e-18);
        }),
        RUNS,
      );
    },
    SLOW,
  );

  it(
    'water: what came through the wall is in the food, to 1e-9',
    () => {
      // The flux at Chebyshev points of each leg, from the moisture reported there, integrated by Clenshaw–Curtis.
      const count = 32;
      const nodes = Array.from({ length: count + 1 }, (_, k) => (1 - Math.cos((Math.PI * k) / count)) / 2);
      const weights = nodes.map((_, k) => {
        let sum = 1;
        for (let j = 1; j <= count / 2; j++) {
          const b = j === count / 2 ? 1 : 2;
          sum -= (b / (4 * j * j - 1)) * Math.cos((2 * j * k * Math.PI) / count);
        }
        return ((k === 0 || k === count ? 1 : 2) * sum) / (2 * count);
      });
      const slow = fc.record({ um: number(20, 200), mass: number(0.2, 1), from: number(0.02, 0.1) });
      fc.assert(
        fc.property(slow, legs, ({ um, mass, from }, route) => {
          const given = description({
            layers: [polyester, { ...polyethylene, thickness_um: um }],
            food: {
              mass_kg: mass,
              isotherm: GAB,
              initial_moisture_g_per_g: from,
              inside_relative_humidity: undefined,
            },
            route: held(route),
            limits: {},
            horizon_days: total(route),
            report_days: route.flatMap(({ days }, i) =>
              nodes.map((node) => Math.min(total(route), total(route.slice(0, i)) + node * days)),
            ),
          });
          const moisture = storage(given).courses?.moisture_g_per_g ?? [];
          const activity = isothermActivity(GAB, moisture);
          let came = 0;
          let turnover = 0;
          route.forEach(({ temperature_C, relative_humidity, days }, i) => {
            const conductance = packConductance(given.pack, {
              temperature_C,
              relative_humidity_outside: relative_humidity,
              relative_humidity_inside: 0.5,
            }).water.total_mol_per_s_Pa;
            const perHumidity =
              conductance * saturationPressurePa(temperature_C) * WATER_MOLAR_MASS * days * 86_400;
            nodes.forEach((_, k) => {
              const part = weights[k] * perHumidity * (relative_humidity - activity[i * nodes.length + k]);
              came += part;
              turnover += Math.abs(part);
            });
          });
          const gained = ((moisture[moisture.length - 1] - from) * mass) / (1 + from);
          // The report's moistures carry 1e-9 of themselves, so food hardly moved is judged by what it holds.
          expect(Math.abs(gained - came)).toBeLessThanOrEqual(1e-9 * (turnover + from * mass));
        }),
        RUNS,
      );
    },
    SLOW,
  );
});

describe('a route', () => {
  it(
    'does not change when a leg is split',
    () => {
      fc.assert(
        fc.property(layers, legs, number(0.05, 0.95), fc.nat(4), (wall, route, part, which) => {
          const index = which % route.length;
          const split = route.flatMap((one, i) =>
            i === index
              ? [
                  { ...one, days: one.days * part },
                  { ...one, days: one.days * (1 - part) },
                ]
              : [one],
          );
          const run = (list: LegDescription[]) =>
            storage(
              description({
                layers: wall,
                food: {
                  oxygen_mode: 'rate',
                  rate_constant_mol_per_kg_s_Pa: 3e-14,
                  isotherm: GAB,
                  initial_moisture_g_per_g: 0.03,
                  inside_relative_humidity: undefined,
                },
                route: held(list),
                limits: {},
                horizon_days: 120,
                report_days: [120],
              }),
            ).courses;
          const whole = run(route);
          const cut = run(split);
          expect(near(whole?.moisture_g_per_g?.[0] ?? NaN, cut?.moisture_g_per_g?.[0] ?? NaN, PROMISED)).toBe(
            true,
          );
          expect(
            near(whole?.oxygen_uptake_mg_per_kg[0] ?? NaN, cut?.oxygen_uptake_mg_per_kg[0] ?? NaN, PROMISED),
          ).toBe(true);
        }),
        RUNS,
      );
    },
    SLOW,
  );

  it(
    'lasts as many times longer as everything is slower',
    () => {
      fc.assert(
        fc.property(plainLayers, number(0.1, 10), number(0.2, 0.9), (wall, factor, outside) => {
          const slower = wall.map((layer): LayerDescription => {
            if (layer.kind === 'foil') return layer;
            if (layer.kind === 'coating') {
              const permeance = layer.oxygen.permeance_mol_per_m2_s_Pa / factor;
              const gas = { permeance_mol_per_m2_s_Pa: permeance };
              return { ...layer, oxygen: gas, water: gas };
            }
            return { ...layer, thickness_um: layer.thickness_um * factor };
          });
          const run = (list: LayerDescription[]): number =>
            daysOf(
              description({
                layers: list,
                pack: { headspace_cm3: 0, starting_headspace_oxygen_percent: 0 },
                route: at(outside),
                horizon_days: 1e6,
              }),
            );
          const before = run(wall);
          const after = run(slower);
          if (Number.isFinite(before) && Number.isFinite(after)) {
            expect(near(after, before * factor, 1e-9)).toBe(true);
          } else expect(Math.max(before * factor, after)).toBeGreaterThan(1e6 * 0.999);
        }),
        RUNS,
      );
    },
    SLOW,
  );
});

describe('days', () => {
  const gaining = (wall: LayerDescription[], more: { area?: number; limit?: number; outside?: number }) =>
    daysOf(
      description({
        pack: { walls: [{ name: 'wall', area_m2: more.area ?? 0.05, layers: wall }] },
        food: { isotherm: GAB, initial_moisture_g_per_g: 0.02, inside_relative_humidity: undefined },
        route: at(more.outside ?? 0.8),
        limits: { moisture_max_g_per_g: more.limit ?? 0.06 },
        horizon_days: 5000,
      }),
    );
  const PLAIN = 1 + 1e-8;

  it(
    'do not come earlier for a higher limit, whatever the wall',
    () => {
      fc.assert(
        fc.property(layers, number(0.025, 0.08), number(1, 2), (wall, limit, factor) => {
          expect(gaining(wall, { limit: limit * factor }) * PLAIN).toBeGreaterThanOrEqual(
            gaining(wall, { limit }),
          );
        }),
        RUNS,
      );
    },
    SLOW,
  );

  it(
    'come earlier for a higher limit where it is a lower one: food that dries',
    () => {
      fc.assert(
        fc.property(plainLayers, number(0.05, 0.08), number(1.01, 1.2), (wall, limit, factor) => {
          const drying = (moisture_min_g_per_g: number): number =>
            daysOf(
              description({
                layers: wall,
                food: { isotherm: GAB, initial_moisture_g_per_g: 0.12, inside_relative_humidity: undefined },
                route: at(0.2),
                limits: { moisture_min_g_per_g },
                horizon_days: 5000,
              }),
            );
          expect(drying(limit * factor)).toBeLessThanOrEqual(drying(limit) * PLAIN);
        }),
        RUNS,
      );
    },
    SLOW,
  );

  it(
    'do not come later for a larger area or, of moisture gained, for moister air outside, behind plain walls',
    () => {
      fc.assert(
        fc.property(
          plainLayers,
          number(0.01, 0.2),
          number(1, 3),
          number(0.5, 0.9),
          number(0, 0.1),
          (wall, area, factor, outside, more) => {
            const before = gaining(wall, { area, outside });
            expect(gaining(wall, { area: area * factor, outside })).toBeLessThanOrEqual(before * PLAIN);
            expect(gaining(wall, { area, outside: outside + more })).toBeLessThanOrEqual(before * PLAIN);
          },
        ),
        RUNS,
      );
    },
    SLOW,
  );

  it(
    'of oxygen come later in moister air behind a plain wall, since water displaces oxygen, and earlier behind a humid one',
    () => {
      const oxygen = (wall: LayerDescription[], outside: number): number =>
        daysOf(
          description({
            layers: wall,
            route: at(outside),
            horizon_days: 1e6,
            limits: { oxygen_uptake_mg_per_kg: 90 },
          }),
        );
      fc.assert(
        fc.property(number(10, 100), number(0.3, 0.8), number(0.05, 0.2), (um, outside, more) => {
          const plain = [polyester, { ...polyethylene, thickness_um: um }];
          expect(oxygen(plain, outside + more)).toBeGreaterThan(oxygen(plain, outside));
          const humid = [vinylAlcohol, { ...polyethylene, thickness_um: um }];
          expect(oxygen(humid, Math.max(0.5, outside) + more)).toBeLessThan(
            oxygen(humid, Math.max(0.5, outside)),
          );
        }),
        RUNS,
      );
    },
    SLOW,
  );
});
