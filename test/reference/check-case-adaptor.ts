import {
  drawColumns,
  elasticities,
  equalProgress,
  InputError,
  isothermActivity,
  isothermMoisture,
  largestPermeance,
  layerAt,
  light,
  packConductance,
  pinhole,
  pouchArea,
  rateToPermeance,
  requiredThickness,
  sampleDraws,
  saturationPressurePa,
  storage,
  summariseDraws,
  timeLag,
  transient,
  wallState,
  type DrawColumn,
  type StorageDescription,
} from '../../shared/engine';
import { convert, UnitError } from '../../shared/units';

export type Json = string | number | boolean | null | Json[] | { [key: string]: Json };

/** One case of the shape described in check-cases.json. */
export interface CheckCase {
  id: string;
  section: string;
  description?: string;
  input: { calculation: string; [key: string]: Json };
  expected: Json;
  rtol: number;
}

export interface CheckCaseFile {
  atol_by_key: Record<string, number>;
  cases: CheckCase[];
}

export interface Mismatch {
  path: string;
  expected: unknown;
  got: unknown;
}

export type CaseOutcome =
  { status: 'passed' } | { status: 'failed'; mismatches: Mismatch[] } | { status: 'skipped'; reason: string };

type Calculation = (input: CheckCase['input']) => unknown;

/** The engine takes whatever a case holds: it refuses what it cannot use, and that is part of what is checked. */
function as<Shape>(value: unknown): Shape {
  return value as Shape;
}

/** Keys of a case that belong to the calculation, without its name. */
function withoutName(input: CheckCase['input']): Record<string, Json> {
  const { calculation: _name, ...rest } = input;
  return rest;
}

function numbers(value: unknown, path: string): number[] {
  if (value === undefined) return [];
  if (!Array.isArray(value)) throw new InputError(path, value, 'A list of numbers is needed.');
  return value as number[];
}

const CALCULATIONS: Record<string, Calculation> = {
  convert: (input) => ({
    value: convert(as<number>(input.value), as<string>(input.from_unit), as<string>(input.to_unit)),
  }),
  rate_to_permeance: (input) => rateToPermeance(as(withoutName(input))),
  saturation: (input) => ({
    pressure_Pa: numbers(input.temperature_C, 'temperature_C').map((temperature) =>
      saturationPressurePa(temperature),
    ),
  }),
  layer: (input) => layerAt(as(input.layer), as(withoutName(input))),
  laminate: (input) => wallState(as(input.layers), as(withoutName(input))),
  pinhole: (input) => pinhole(as(withoutName(input))),
  pouch_area: (input) => pouchArea(as(withoutName(input))),
  pack: (input) => packConductance(as(input.pack), as(withoutName(input))),
  isotherm: (input) => ({
    moisture_g_per_g: isothermMoisture(as(input.isotherm), numbers(input.water_activity, 'water_activity')),
    water_activity: isothermActivity(as(input.isotherm), numbers(input.moisture_g_per_g, 'moisture_g_per_g')),
  }),
  storage: (input) => storage(as(withoutName(input))),
  elasticity: (input) => elasticities(as(withoutName(input))),
  monte_carlo: monteCarlo,
  time_lag: (input) => timeLag(as(withoutName(input))),
  transient: (input) => transient(as(withoutName(input))),
  equal_progress: (input) => equalProgress(as(withoutName(input))),
  largest_permeance: (input) => largestPermeance(as(withoutName(input))),
  required_thickness: (input) => requiredThickness(as(withoutName(input))),
  light: (input) => light(as(input.layers)),
};

/** More draws than a case asks for: its expected values are exact, and a draw costs little. */
const FEWEST_DRAWS = 60_000;
const SEED = 20_240_611;

/** One log-normal input, its percentiles and the chance of a target. */
function monteCarlo(input: CheckCase['input']): unknown {
  const study = as<StorageDescription>(input.storage);
  const limit = as<DrawColumn>(input.limit);
  const columns = drawColumns(study);
  const days = sampleDraws(
    study,
    {
      inputs: [
        {
          distribution: 'log-normal',
          input: as<string>(input.uncertain),
          geometric_sd: as<number>(input.geometric_sd),
        },
      ],
    },
    { seed: SEED, firstDraw: 0, count: Math.max(FEWEST_DRAWS, as<number>(input.samples)) },
  );
  if (!columns.includes(limit)) throw new InputError('limit', limit, 'The description does not set it.');
  const summary = summariseDraws(days, columns, {
    column: limit,
    target_days: as<number>(input.target_days),
  });
  return {
    p5_days: summary.p5.days,
    p50_days: summary.p50.days,
    p95_days: summary.p95.days,
    chance_of_target: summary.chance_of_target?.chance ?? null,
  };
}

/** Fits from lab files are computed from a later version on. */
const SECTION_TO_COME = 10;

export function runCase(given: CheckCase, atolByKey: Record<string, number>): CaseOutcome {
  const name = given.input?.calculation;
  const calculation = Object.prototype.hasOwnProperty.call(CALCULATIONS, name)
    ? CALCULATIONS[name]
    : undefined;
  if (!calculation) {
    if (Number.parseFloat(String(given.section)) !== SECTION_TO_COME) {
      return failed('input.calculation', 'a known calculation', name);
    }
    return { status: 'skipped', reason: `${name} is not in the engine yet` };
  }
  const expectsError = isObject(given.expected) && given.expected.error === true;
  let answer: unknown;
  try {
    answer = calculation(given.input);
  } catch (error) {
    if (!(error instanceof InputError || error instanceof UnitError)) {
      return failed(
        '',
        given.expected,
        error instanceof Error ? `${error.name}: ${error.message}` : String(error),
      );
    }
    return expectsError ? { status: 'passed' } : failed('', given.expected, `refused: ${error.message}`);
  }
  if (expectsError) return failed('', { error: true }, answer);
  const mismatches: Mismatch[] = [];
  compare(given.expected, answer, { path: '', atol: null, rtol: given.rtol ?? 0, atolByKey }, mismatches);
  return mismatches.length === 0 ? { status: 'passed' } : { status: 'failed', mismatches };
}

function failed(path: string, expected: unknown, got: unknown): CaseOutcome {
  return { status: 'failed', mismatches: [{ path, expected, got }] };
}

const SMALLEST_ATOL = 1e-30;

interface Comparison {
  path: string;
  /** From the nearest enclosing key that has one. */
  atol: number | null;
  rtol: number;
  atolByKey: Record<string, number>;
}

/** Every expected key must be there; further keys of the answer are fine. */
export function compare(expected: unknown, got: unknown, at: Comparison, mismatches: Mismatch[]): void {
  const differs = (): void => void mismatches.push({ path: at.path, expected, got });
  if (typeof expected === 'number') {
    const allowed = at.rtol * Math.abs(expected) + (at.atol ?? SMALLEST_ATOL);
    if (typeof got !== 'number' || !(Math.abs(got - expected) <= allowed)) differs();
    return;
  }
  if (Array.isArray(expected)) {
    if (!Array.isArray(got) || got.length !== expected.length) return differs();
    expected.forEach((item, i) => compare(item, got[i], { ...at, path: `${at.path}[${i}]` }, mismatches));
    return;
  }
  if (isObject(expected)) {
    if (!isObject(got)) return differs();
    for (const [key, item] of Object.entries(expected)) {
      const path = at.path === '' ? key : `${at.path}.${key}`;
      if (!Object.prototype.hasOwnProperty.call(got, key)) {
        mismatches.push({ path, expected: item, got: 'nothing' });
        continue;
      }
      const own = Object.prototype.hasOwnProperty.call(at.atolByKey, key) ? at.atolByKey[key] : at.atol;
      compare(item, got[key], { ...at, path, atol: own }, mismatches);
    }
    return;
  }
  if (expected !== got) differs();
}

function isObject(value: unknown): value is Record<string, unknown> {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}

/** A file's text as cases. Errors: one that says what is wrong with the file. */
export function readCheckCases(text: string): CheckCaseFile {
  const parsed: unknown = JSON.parse(text);
  if (!isObject(parsed) || !Array.isArray(parsed.cases)) throw new Error('The file has no list "cases".');
  const atol = isObject(parsed.atol_by_key) ? parsed.atol_by_key : {};
  return { atol_by_key: atol as Record<string, number>, cases: parsed.cases as CheckCase[] };
}
