import { DAY_S, MOL_PER_CM3_STP, WATER_MOLAR_MASS } from '../units';
import { daysToLimit, onlyLimit } from './days-to-limit';
import type { TransmissionTest } from './description/evaluation';
import { InputError } from './description/input-error';
import { TARGET_DAYS } from './description/ranges';
import { readChoice, readNumber, readObject } from './description/read-number';
import { readStorage } from './description/read-storage';
import type { LimitName, StorageDescription } from './description/storage-description';
import { findCrossings } from './find-crossing';
import type { StorageSystem } from './storage-system';
import { readLimit, thicken, VariableSystem } from './variable-system';
import { WallAtTemperature } from './wall-at-temperature';
import { readTest } from './wall-in-test';
import { saturationPressureAtK } from './water-vapour';

interface TargetRequest {
  storage: StorageDescription;
  limit: LimitName;
  target_days: number;
}

export interface LargestPermeanceRequest extends TargetRequest {
  gas: 'oxygen' | 'water';
  /** The test in which the rate is stated: as in a data sheet, the same humidity on both sides for oxygen. */
  test:
    | { temperature_C: number; relative_humidity: number; oxygen_mole_fraction_dry: number }
    | { temperature_C: number; relative_humidity_high: number; relative_humidity_low: number };
}

/** 'always met': at any factor or thickness searched; 'never met': at none of them. */
export type TargetStatus = 'found' | 'always met' | 'never met';

export interface LargestPermeanceAnswer {
  status: TargetStatus;
  /** On every wall's permeance to the gas; seal and leaks as they are. null unless found. */
  factor: number | null;
  /** The walls' area-mean rate in the test, at that factor: one of the two, by the gas. null unless found. */
  rate_cm3_STP_per_m2_day?: number | null;
  rate_g_per_m2_day?: number | null;
  /** Days as described, null where the limit is not reached within four times the target. */
  days_as_described: number | null;
}

export interface RequiredThicknessRequest extends TargetRequest {
  wall: number;
  layer: number;
}

export interface RequiredThicknessAnswer {
  status: TargetStatus;
  /** The thinnest film that meets the target; null unless found. */
  thickness_um: number | null;
  /** Further thicknesses at which the days pass the target, upwards or downwards: more is not always better. */
  further_crossings: { thickness_um: number; meets: 'above' | 'below' }[];
  days_as_described: number | null;
}

/** Days are followed this far beyond the target, so that a search sees on which side of it they lie. */
const FOLLOWED = 4;
/** Of ln x: far below what a gauge or a rate is known to. */
const TOLERANCE = 1e-9;
const RUN_TOLERANCE = 1e-8;
const FACTOR_DECADES = { from: -8, to: 8, perDecade: 3 };
const THICKNESS_DECADES_UM = { from: -3, to: 5, perDecade: 6 };

function gridOf({ from, to, perDecade }: { from: number; to: number; perDecade: number }): number[] {
  const count = (to - from) * perDecade;
  return Array.from({ length: count + 1 }, (_, i) => (from + i / perDecade) * Math.LN10);
}

/** A search over ln x for days = target. */
class TargetSearch {
  readonly variable: VariableSystem;
  readonly limit: LimitName;
  readonly targetDays: number;

  constructor(request: TargetRequest, system: StorageSystem) {
    this.limit = readLimit(request.limit, 'limit', system);
    this.targetDays = readNumber(request.target_days, 'target_days', {
      range: TARGET_DAYS,
      label: 'Target',
      unit: 'days',
    });
    this.variable = new VariableSystem(onlyLimit(system, this.limit, FOLLOWED * this.targetDays * DAY_S));
  }

  days(): number {
    return daysToLimit(this.variable.system, this.limit, RUN_TOLERANCE);
  }

  /** ln(days/target) held within ±ln 4: what lies farther is only known by its side. */
  surplus(): number {
    const most = Math.log(FOLLOWED);
    return Math.max(-most, Math.min(most, Math.log(this.days() / this.targetDays)));
  }

  daysAsDescribed(): number | null {
    this.variable.reset();
    const days = this.days();
    return Number.isFinite(days) ? days : null;
  }
}

/**
 * The loosest barrier to one gas that just meets a target: one factor on every wall's permeance to it, and the walls'
 * area-mean transmission rate at that factor in a test of choice [cm³(STP)/(m²·day) or g/(m²·day)].
 * Scans ln(factor) over sixteen decades, then narrows (find-crossing.ts). Where days are not monotone in the factor
 * the largest one that meets the target is given. Range: as storage. Errors: InputError. Accuracy: 1e-8 in the
 * factor. Cost: some sixty runs.
 */
export function largestPermeance(request: LargestPermeanceRequest): LargestPermeanceAnswer {
  const given = readObject<LargestPermeanceRequest>(request, '', 'Description');
  const system = readStorage(given.storage);
  const gas = readChoice(given.gas, 'gas', { choices: ['oxygen', 'water'] as const, label: 'Gas' });
  const rateAtOne = meanRate(system, gas, given.test);
  const search = new TargetSearch(given, system);
  const { pack } = search.variable.system;
  const key = gas === 'oxygen' ? 'oxygenFactor' : 'waterFactor';
  const surplusAt = (lnFactor: number): number => {
    pack[key] = Math.exp(lnFactor);
    return search.surplus();
  };
  const grid = gridOf(FACTOR_DECADES);
  const crossings = findCrossings(surplusAt, grid, { tolerance: TOLERANCE, near: 0.3 });
  const largest = crossings.filter((crossing) => !crossing.isUp).at(-1);
  const isMetAtLoosest = surplusAt(grid[grid.length - 1]) >= 0;
  pack[key] = 1;
  const days_as_described = search.daysAsDescribed();
  const rateName = gas === 'oxygen' ? 'rate_cm3_STP_per_m2_day' : 'rate_g_per_m2_day';
  if (isMetAtLoosest || !largest) {
    return {
      status: isMetAtLoosest ? 'always met' : 'never met',
      factor: null,
      [rateName]: null,
      days_as_described,
    };
  }
  const factor = Math.exp(largest.at);
  return { status: 'found', factor, [rateName]: factor * rateAtOne, days_as_described };
}

/** Area-mean rate of the walls in a test, in the units of the answer. */
function meanRate(
  system: StorageSystem,
  gas: 'oxygen' | 'water',
  value: LargestPermeanceRequest['test'],
): number {
  const test = readObject<Record<string, number>>(value, 'test', 'Test');
  const full =
    gas === 'oxygen'
      ? {
          gas,
          temperature_C: test.temperature_C,
          relative_humidity_outside: test.relative_humidity,
          relative_humidity_inside: test.relative_humidity,
          oxygen_mole_fraction_dry: test.oxygen_mole_fraction_dry,
        }
      : {
          gas,
          temperature_C: test.temperature_C,
          relative_humidity_high: test.relative_humidity_high,
          relative_humidity_low: test.relative_humidity_low,
        };
  const conditions = readTest(full satisfies TransmissionTest, 'test');
  let flow = 0;
  let area = 0;
  for (const { layers, areaM2 } of system.pack.walls) {
    const wall = new WallAtTemperature(layers, conditions.temperatureK);
    wall.solve(conditions.humidityOutside, conditions.humidityInside);
    flow += areaM2 * (gas === 'oxygen' ? wall.oxygenPermeance : wall.waterPermeance);
    area += areaM2;
  }
  if (gas === 'oxygen') return (flow / area) * conditions.oxygenOutsidePa * (DAY_S / MOL_PER_CM3_STP);
  const difference =
    (conditions.humidityOutside - conditions.humidityInside) * saturationPressureAtK(conditions.temperatureK);
  return (flow / area) * difference * WATER_MOLAR_MASS * 1e3 * DAY_S;
}

/**
 * The thickness [µm] of one film at which the days to a limit just meet a target. Scans ln(thickness) from 1 nm to
 * 10 cm and looks for summits between, as days need not rise with thickness (more sealant inside a humidity-sensitive
 * layer can make it worse); the thinnest is given, and the others with it.
 * Range: films; a coating's or foil's barrier does not scale with thickness and is refused. Errors: InputError.
 * Accuracy: 1e-8 relative. Cost: some eighty runs.
 */
export function requiredThickness(request: RequiredThicknessRequest): RequiredThicknessAnswer {
  const given = readObject<RequiredThicknessRequest>(request, '', 'Description');
  const system = readStorage(given.storage);
  const place = (value: unknown, path: string, count: number): number => {
    const index = readNumber(value, path, {
      range: { min: 0, max: count - 1 },
      label: `Number of the ${path}`,
    });
    if (!Number.isInteger(index)) throw new InputError(path, index, `Number of the ${path}: whole, from 0.`);
    return index;
  };
  const wall = place(given.wall, 'wall', system.pack.walls.length);
  const layer = place(given.layer, 'layer', system.pack.walls[wall].layers.length);
  const chosen = system.pack.walls[wall].layers[layer];
  if (chosen.kind !== 'film') {
    throw new InputError(
      'layer',
      layer,
      `${chosen.name} is a ${chosen.kind}: its barrier does not scale with thickness. Choose a film.`,
    );
  }
  const search = new TargetSearch(given, system);
  const surplusAt = (lnUm: number): number => {
    search.variable.reset();
    thicken(search.variable.layerOf({ wall, layer }), (Math.exp(lnUm) * 1e-6) / chosen.thicknessM);
    return search.surplus();
  };
  const grid = gridOf(THICKNESS_DECADES_UM);
  const crossings = findCrossings(surplusAt, grid, { tolerance: TOLERANCE, near: 0.5 });
  const isMetThinnest = surplusAt(grid[0]) >= 0;
  const first = isMetThinnest ? undefined : crossings[0];
  const further_crossings = crossings
    .filter((crossing) => crossing !== first)
    .map((crossing) => ({
      thickness_um: Math.exp(crossing.at),
      meets: crossing.isUp ? ('above' as const) : ('below' as const),
    }));
  return {
    status: first ? 'found' : isMetThinnest ? 'always met' : 'never met',
    thickness_um: first ? Math.exp(first.at) : null,
    further_crossings,
    days_as_described: search.daysAsDescribed(),
  };
}
