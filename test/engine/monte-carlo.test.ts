import * as fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  drawColumns,
  InputError,
  sampleDraws,
  storage,
  summariseDraws,
  type StorageDescription,
  type UncertaintyDescription,
} from '../../shared/engine';
import { normalProbability, normalQuantile } from '../../shared/engine/normal';
import { philox, uniformOf } from '../../shared/engine/philox';
import { coatingOf, description, foil, polyester, polyethylene, vinylAlcohol } from './descriptions';

const GAB = { type: 'GAB' as const, Xm_g_per_g: 0.055, C: 14, K: 0.86 };

/** One film and no headspace: days = limit/(K p_out), so days are log-normal when the permeability is. */
const oneFilm: StorageDescription = description({
  layers: [{ ...polyester, thickness_um: 20 }],
  pack: { headspace_cm3: 0, starting_headspace_oxygen_percent: 0 },
  horizon_days: 1e6,
});
const logNormal = (geometric_sd: number): UncertaintyDescription => ({
  inputs: [{ distribution: 'log-normal', input: 'layer_oxygen:0:0', geometric_sd }],
});

const coupled = description({
  layers: [polyester, vinylAlcohol, polyethylene],
  food: { isotherm: GAB, initial_moisture_g_per_g: 0.02, inside_relative_humidity: undefined },
  route: { legs: [{ temperature_C: 25, relative_humidity: 0.75, days: 1 }], after_last: 'hold' },
  limits: { oxygen_uptake_mg_per_kg: 60, moisture_max_g_per_g: 0.06 },
  horizon_days: 400,
});
const many: UncertaintyDescription = {
  inputs: [
    { distribution: 'log-normal', input: 'layer_oxygen:0:1', geometric_sd: 1.4 },
    { distribution: 'log-normal', input: 'layer_water:0:2', geometric_sd: 1.25, group: 'sealant' },
    { distribution: 'log-normal', input: 'layer_oxygen:0:2', geometric_sd: 1.2, group: 'sealant' },
    { distribution: 'truncated normal', input: 'layer_thickness:0:2', relative_sd: 0.06 },
    { distribution: 'condition', leg: 0, temperature_sd_K: 2, relative_humidity_sd: 0.05 },
    {
      distribution: 'fit',
      input: 'layer_water:0:0',
      ln_value_sd: 0.08,
      activation_energy_sd_J_per_mol: 2500,
      correlation: -0.4,
    },
  ],
};

const bytes = (draws: Float64Array): string => Buffer.from(draws.buffer).toString('base64');

describe('random numbers', () => {
  it('are those of the published vectors (Random123: philox4x32-10)', () => {
    const words = new Uint32Array(4);
    const of = (counter: [number, number, number, number], key: [number, number]): string[] => {
      philox(counter, key, words);
      return Array.from(words, (word) => word.toString(16).padStart(8, '0'));
    };
    const all = 0xffffffff;
    expect(of([0, 0, 0, 0], [0, 0])).toEqual(['6627e8d5', 'e169c58d', 'bc57ac4c', '9b00dbd8']);
    expect(of([all, all, all, all], [all, all])).toEqual(['408f276d', '41c83b0e', 'a20bc7c6', '6d5451fd']);
    expect(of([0x243f6a88, 0x85a308d3, 0x13198a2e, 0x03707344], [0xa4093822, 0x299f31d0])).toEqual([
      'd16cfe09',
      '94fdcceb',
      '5001e420',
      '24126ea1',
    ]);
  });

  it('lie within 0 to 1 and never at an end', () => {
    expect(uniformOf(0, 0)).toBeGreaterThan(0);
    expect(uniformOf(0xffffffff, 0xffffffff)).toBeLessThan(1);
  });

  it('become normal by inversion: quantiles as tabulated, and back (AS 241)', () => {
    expect(normalQuantile(0.975)).toBeCloseTo(1.959_963_984_540_054, 14);
    expect(normalQuantile(0.25)).toBeCloseTo(-0.674_489_750_196_081_7, 14);
    expect(normalQuantile(1e-12)).toBeCloseTo(-7.034_483_825_301_131, 11);
    fc.assert(
      fc.property(fc.double({ min: 1e-9, max: 1 - 1e-9, noNaN: true }), (p) => {
        expect(Math.abs(normalProbability(normalQuantile(p)) - p)).toBeLessThan(1e-14);
      }),
      { numRuns: 1000 },
    );
  });
});

describe('draws', () => {
  it('are the same bytes however they are shared out', () => {
    const whole = bytes(sampleDraws(coupled, many, { seed: 7, firstDraw: 0, count: 60 }));
    fc.assert(
      fc.property(fc.uniqueArray(fc.integer({ min: 1, max: 59 }), { maxLength: 4 }), (cuts) => {
        const ends = [0, ...cuts.sort((a, b) => a - b), 60];
        const parts = ends
          .slice(1)
          .map((end, i) => sampleDraws(coupled, many, { seed: 7, firstDraw: ends[i], count: end - ends[i] }));
        expect(bytes(Float64Array.from(parts.flatMap((part) => [...part])))).toBe(whole);
      }),
      { numRuns: 40 },
    );
    expect(bytes(sampleDraws(coupled, many, { seed: 8, firstDraw: 0, count: 60 }))).not.toBe(whole);
  });

  it('without spread are the answer itself, to 1e-4 and far better', () => {
    const { limits, shelf_life_days } = storage(coupled);
    const [oxygen, moisture, first] = sampleDraws(
      coupled,
      { inputs: [] },
      { seed: 1, firstDraw: 0, count: 1 },
    );
    expect(drawColumns(coupled)).toEqual(['oxygen_uptake_mg_per_kg', 'moisture_max_g_per_g', 'shelf_life']);
    const days = (name: 'oxygen_uptake_mg_per_kg' | 'moisture_max_g_per_g'): number => {
      const answer = limits[name];
      return answer?.status === 'reached' ? answer.days : Infinity;
    };
    expect(oxygen / days('oxygen_uptake_mg_per_kg')).toBeCloseTo(1, 4);
    expect(moisture / days('moisture_max_g_per_g')).toBeCloseTo(1, 4);
    expect(first / (shelf_life_days ?? Number.NaN)).toBeCloseTo(1, 4);
  });

  it('of one group move together', () => {
    const twice = (group?: string): Float64Array =>
      sampleDraws(
        {
          ...oneFilm,
          pack: { ...oneFilm.pack, walls: [{ name: 'wall', area_m2: 0.06, layers: [polyester, polyester] }] },
        },
        {
          inputs: [0, 1].map((layer) => ({
            distribution: 'log-normal' as const,
            input: `layer_oxygen:0:${layer}`,
            geometric_sd: 1.5,
            ...(group ? { group } : {}),
          })),
        },
        { seed: 3, firstDraw: 0, count: 4000 },
      );
    const spread = (draws: Float64Array): number => {
      const logs = Array.from(draws, Math.log).filter((_, i) => i % 2 === 0);
      const mean = logs.reduce((sum, value) => sum + value, 0) / logs.length;
      return Math.sqrt(logs.reduce((sum, value) => sum + (value - mean) ** 2, 0) / logs.length);
    };
    expect(spread(twice('resin'))).toBeCloseTo(Math.log(1.5), 1);
    expect(spread(twice())).toBeLessThan(0.8 * Math.log(1.5));
  });

  it('that reach no limit count as longest, and end in data', () => {
    const days = sampleDraws(
      description({ layers: [foil] }),
      { inputs: [] },
      { seed: 1, firstDraw: 0, count: 5 },
    );
    const columns = drawColumns(description({ layers: [foil] }));
    const summary = summariseDraws(days, columns, { column: 'shelf_life', target_days: 100 });
    expect(summary).toMatchObject({
      draws: 5,
      not_reached: 1,
      chance_of_target: { chance: 1, standard_error: 0 },
    });
    expect(JSON.parse(JSON.stringify(summary))).toEqual(summary);
    expect(summary.p50).toEqual({ days: null, low_days: null, high_days: null, standard_error_days: null });
  });

  it('are refused where the spread makes no sense', () => {
    const refuse = (input: unknown): void =>
      void expect(() =>
        sampleDraws(coupled, { inputs: [input] } as UncertaintyDescription, {
          seed: 1,
          firstDraw: 0,
          count: 1,
        }),
      ).toThrow(InputError);
    refuse({ distribution: 'log-normal', input: 'layer_oxygen:0:9', geometric_sd: 1.2 });
    refuse({ distribution: 'log-normal', input: 'layer_oxygen:0:0', geometric_sd: 0.5 });
    refuse({ distribution: 'truncated normal', input: 'food_mass', relative_sd: 0.5 });
    refuse({ distribution: 'condition', leg: 1 });
    refuse({ distribution: 'fit', input: 'food_mass', ln_value_sd: 0.1, activation_energy_sd_J_per_mol: 1 });
    refuse({ distribution: 'even' });
    expect(() => sampleDraws(coupled, many, { seed: -1, firstDraw: 0, count: 1 })).toThrow(InputError);
  });
});

describe('percentiles', () => {
  it('P5 and P95 of days known in closed form: seeds 1 to 200, at most 4 of 400 beyond three sampling errors', () => {
    const sd = 1.35;
    const median = storage(oneFilm).shelf_life_days ?? Number.NaN;
    const columns = drawColumns(oneFilm);
    let beyond = 0;
    for (let seed = 1; seed <= 200; seed++) {
      const days = sampleDraws(oneFilm, logNormal(sd), { seed, firstDraw: 0, count: 5000 });
      const { p5, p95 } = summariseDraws(days, columns, { column: 'shelf_life' });
      for (const [quantile, p] of [
        [p5, 0.05],
        [p95, 0.95],
      ] as const) {
        const exact = median * sd ** normalQuantile(p);
        const off = Math.abs((quantile.days ?? Number.NaN) - exact);
        if (!(off <= 3 * (quantile.standard_error_days ?? 0))) beyond += 1;
      }
    }
    expect(beyond).toBeLessThanOrEqual(4);
  }, 240_000);

  it('of a gauge: the truncated normal of a layer in series', () => {
    // With the film alone days are in proportion to its gauge.
    const draws = sampleDraws(
      oneFilm,
      { inputs: [{ distribution: 'truncated normal', input: 'layer_thickness:0:0', relative_sd: 0.1 }] },
      { seed: 11, firstDraw: 0, count: 40_000 },
    );
    const median = storage(oneFilm).shelf_life_days ?? Number.NaN;
    const cut = normalProbability(-3);
    const exact = (p: number): number => median * (1 + 0.1 * normalQuantile(cut + p * (1 - 2 * cut)));
    const { p5, p50, p95, chance_of_target } = summariseDraws(draws, drawColumns(oneFilm), {
      column: 'shelf_life',
      target_days: median,
    });
    for (const [quantile, p] of [
      [p5, 0.05],
      [p50, 0.5],
      [p95, 0.95],
    ] as const) {
      expect(Math.abs((quantile.days ?? 0) - exact(p))).toBeLessThan(4 * (quantile.standard_error_days ?? 0));
      expect(quantile.low_days).toBeLessThan(quantile.days ?? 0);
      expect(quantile.high_days).toBeGreaterThan(quantile.days ?? 0);
    }
    expect(Math.abs((chance_of_target?.chance ?? 0) - 0.5)).toBeLessThan(
      4 * (chance_of_target?.standard_error ?? 0),
    );
    expect(chance_of_target?.standard_error).toBeCloseTo(Math.sqrt(0.25 / 40_000), 5);
    expect(Math.max(...draws)).toBeLessThanOrEqual(median * 1.3);
  });

  it('of a fit: xᵀΣx at the leg’s temperature, the energy included', () => {
    const warm = {
      ...oneFilm,
      route: { legs: [{ temperature_C: 43, relative_humidity: 0.5, days: 1 }], after_last: 'hold' as const },
    };
    const energySd = 4000;
    const draws = sampleDraws(
      warm,
      {
        inputs: [
          {
            distribution: 'fit',
            input: 'layer_oxygen:0:0',
            ln_value_sd: 0.1,
            activation_energy_sd_J_per_mol: energySd,
            correlation: 0.5,
          },
        ],
      },
      { seed: 5, firstDraw: 0, count: 20_000 },
    );
    const x = -(1 / 316.15 - 1 / 296.15) / 8.314462618;
    const variance = 0.01 + (x * energySd) ** 2 + 2 * 0.5 * 0.1 * x * energySd;
    const logs = Array.from(draws, Math.log).filter((_, i) => i % 2 === 1);
    const mean = logs.reduce((sum, value) => sum + value, 0) / logs.length;
    const found = logs.reduce((sum, value) => sum + (value - mean) ** 2, 0) / logs.length;
    expect(found / variance).toBeGreaterThan(0.95);
    expect(found / variance).toBeLessThan(1.05);
  });

  it('keep finite data with every extreme: steep spread, dry legs, coatings alone', () => {
    const wild = description({
      layers: [coatingOf(1e-14), { ...vinylAlcohol, thickness_um: 1e-9 }],
      food: { isotherm: { ...GAB, K: 1 }, initial_moisture_g_per_g: 0.02 },
      route: {
        legs: [
          { temperature_C: -30, relative_humidity: 0, days: 1 },
          { temperature_C: 60, relative_humidity: 1, days: 1 },
        ],
        after_last: 'repeat',
      },
      limits: { oxygen_uptake_mg_per_kg: 60, moisture_max_g_per_g: 0.2, moisture_min_g_per_g: 0.001 },
      horizon_days: 60,
    });
    const draws = sampleDraws(
      wild,
      {
        inputs: [
          { distribution: 'log-normal', input: 'layer_oxygen:0:0', geometric_sd: 100 },
          { distribution: 'log-normal', input: 'layer_water:0:0', geometric_sd: 100 },
          { distribution: 'condition', leg: 0, temperature_sd_K: 30, relative_humidity_sd: 0.5 },
        ],
      },
      { seed: 2, firstDraw: 0, count: 300 },
    );
    expect(draws.some(Number.isNaN)).toBe(false);
    expect(draws.every((value) => value >= 0)).toBe(true);
  });
});
