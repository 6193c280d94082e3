import { DAY_S } from '../units';
import { secondsToLimit } from './days-to-limit';
import { DRAW_COUNT, DRAW_NUMBER, TARGET_DAYS } from './description/ranges';
import { readNumber, readOptional } from './description/read-number';
import { LIMIT_NAMES, readStorage } from './description/read-storage';
import type { LimitName, StorageDescription } from './description/storage-description';
import { normalQuantile } from './normal';
import { philox, uniformOf } from './philox';
import { runStorage } from './storage-run';
import { readUncertainty, type UncertaintyDescription } from './uncertainty';
import { VariableSystem } from './variable-system';

/** Relative accuracy of a draw's days: far below the spread that draws are made for. */
const DRAW_TOLERANCE = 1e-4;

export interface DrawRange {
  /** Whole number, 0 to 2³² − 1. */
  seed: number;
  firstDraw: number;
  count: number;
}

/** What a row of draws holds: days to each limit set, in this order, and to the first of them. */
export type DrawColumn = LimitName | 'shelf_life';

/** The columns of a study's draws. */
export function drawColumns(description: StorageDescription): DrawColumn[] {
  const given = description.limits;
  const limits = LIMIT_NAMES.filter((name) => given[name] !== undefined && given[name] !== null);
  return [...limits, 'shelf_life'];
}

/**
 * Days [days] to each limit in draws firstDraw to firstDraw + count − 1 of a study whose inputs spread, row by row, one
 * column for each of `drawColumns`; Infinity where the horizon comes first.
 * Random numbers: Philox (philox.ts), counted by draw and by group of inputs, so a draw is the same whoever makes it:
 * workers may share out ranges, and the bytes do not change. Log-normal and truncated normal by inversion (normal.ts).
 * Range: as storage; up to 1e6 draws a call. Errors: InputError. Accuracy of a draw: 1e-4. Cost: a run per draw, some
 * 0.1 ms with moisture and humidity-dependent layers, a tenth of that without.
 */
export function sampleDraws(
  description: StorageDescription,
  uncertainty: UncertaintyDescription,
  range: DrawRange,
): Float64Array {
  const system = readStorage(description);
  const spreads = readUncertainty(uncertainty, 'uncertainty', system);
  const seed = readWhole(range.seed, 'seed', DRAW_NUMBER);
  const firstDraw = readWhole(range.firstDraw, 'firstDraw', DRAW_NUMBER);
  const count = readWhole(range.count, 'count', DRAW_COUNT);
  const limits = LIMIT_NAMES.filter((name) => system.limits[name] !== undefined);
  const width = limits.length + 1;
  const days = new Float64Array(count * width);
  const variable = new VariableSystem({ ...system, reportS: [] });
  const words = new Uint32Array(4);
  for (let i = 0; i < count; i++) {
    variable.reset();
    for (const { group, apply } of spreads) {
      philox([firstDraw + i, group, 0, 0], [seed, 0], words);
      apply(variable, { first: uniformOf(words[0], words[1]), second: uniformOf(words[2], words[3]) });
    }
    const run = runStorage(variable.system, 0, DRAW_TOLERANCE);
    let first = Infinity;
    for (let k = 0; k < limits.length; k++) {
      const atS = secondsToLimit(run, limits[k]);
      const atDays = atS === null ? Infinity : atS / DAY_S;
      days[i * width + k] = atDays;
      if (atDays < first) first = atDays;
    }
    days[i * width + limits.length] = first;
  }
  return days;
}

function readWhole(value: unknown, path: string, range: { min: number; max: number }): number {
  return Math.floor(readNumber(value, path, { range, label: path }));
}

export interface DrawQuantile {
  /** null: beyond the horizon. */
  days: number | null;
  /** Order statistics that hold the true quantile with 95 %; null where they lie beyond the horizon. */
  low_days: number | null;
  high_days: number | null;
  /** √(p(1 − p)/N) over the density there; null where what it is judged by reaches beyond the horizon. */
  standard_error_days: number | null;
}

export interface DrawSummary {
  draws: number;
  p5: DrawQuantile;
  p50: DrawQuantile;
  p95: DrawQuantile;
  /** Share of draws in which the horizon came first. */
  not_reached: number;
  /** Chance that the days are at least the target, and its standard error √(p(1 − p)/N); null without a target. */
  chance_of_target: { chance: number; standard_error: number } | null;
}

/** Of a normal number, between which lies 95 %. */
const TWO_SIDED_95 = 1.959_963_984_540_054;

/**
 * What draws say of one column: P5, P50 and P95 of the days with their sampling error, and the chance to meet a target.
 * Quantiles are order statistics, x_(⌈pN⌉); their intervals are the order statistics √(Np(1 − p)) places off, which
 * supposes nothing of the distribution (the binomial taken as normal). For the standard error the density is taken from
 * the order statistics on either side, as far off as Bofinger (Austral. J. Statist. 17 (1975) 1) found best. A draw that reaches no limit by the horizon
 * counts as longest. `days` is a whole set of draws, in any order; it is not changed. Cost: a sort.
 */
export function summariseDraws(
  days: Float64Array,
  columns: readonly DrawColumn[],
  options: { column: DrawColumn; target_days?: number },
): DrawSummary {
  const width = columns.length;
  const at = columns.indexOf(options.column);
  const draws = Math.floor(days.length / width);
  const sorted = new Float64Array(draws);
  for (let i = 0; i < draws; i++) sorted[i] = days[i * width + at];
  sorted.sort();
  const target = readOptional(options.target_days, 'target_days', {
    range: TARGET_DAYS,
    label: 'Target',
    unit: 'days',
    otherwise: -1,
  });
  let reached = draws;
  while (reached > 0 && sorted[reached - 1] === Infinity) reached -= 1;
  return {
    draws,
    p5: quantileOf(sorted, 0.05),
    p50: quantileOf(sorted, 0.5),
    p95: quantileOf(sorted, 0.95),
    not_reached: (draws - reached) / draws,
    chance_of_target: target < 0 ? null : chanceOf(sorted, target),
  };
}

function chanceOf(sorted: Float64Array, target: number): { chance: number; standard_error: number } {
  let low = 0;
  let high = sorted.length;
  while (low < high) {
    const middle = (low + high) >> 1;
    if (sorted[middle] >= target) high = middle;
    else low = middle + 1;
  }
  const chance = (sorted.length - low) / sorted.length;
  return { chance, standard_error: Math.sqrt((chance * (1 - chance)) / sorted.length) };
}

/** How far from p, in probability, the density at a quantile is best taken from N draws. */
function bofingerReach(p: number, draws: number): number {
  const x = normalQuantile(p);
  const density = Math.exp(-0.5 * x * x) / Math.sqrt(2 * Math.PI);
  return draws ** -0.2 * ((4.5 * density ** 4) / (2 * x * x + 1) ** 2) ** 0.2;
}

function quantileOf(sorted: Float64Array, p: number): DrawQuantile {
  const draws = sorted.length;
  const spread = Math.sqrt(draws * p * (1 - p));
  const rank = Math.ceil(p * draws);
  const ranked = (at: number): number => sorted[Math.min(draws, Math.max(1, at)) - 1];
  const reach = Math.max(1, Math.round(draws * Math.min(bofingerReach(p, draws), 0.9 * p, 0.9 * (1 - p))));
  const [below, above] = [ranked(rank - reach), ranked(rank + reach)];
  const finite = (value: number): number | null => (Number.isFinite(value) ? value : null);
  return {
    days: finite(ranked(rank)),
    low_days: finite(ranked(Math.floor(rank - TWO_SIDED_95 * spread))),
    high_days: finite(ranked(Math.ceil(rank + TWO_SIDED_95 * spread))),
    standard_error_days: finite((spread * (above - below)) / (2 * reach)),
  };
}
