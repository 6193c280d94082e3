import { WATER_MOLAR_MASS } from '../units';
import {
  DEGREE,
  fillFromFour,
  fillFromTwo,
  openEnd,
  openEndOfFour,
  openEndOfTwo,
  whereReaches,
} from './chebyshev';
import { MarchStep } from './march-step';
import { MoistureTracker } from './moisture-tracker';
import { OxygenStore } from './oxygen-store';
import { conditionsOf, type LegConditions, type StorageSystem } from './storage-system';

/** What the whole promises, relative in days, unless less is asked for. */
export const RELATIVE_TOLERANCE = 1e-6;
/**
 * What a step may leave open of that, against time and oxygen passed since day 0: little, as errors of thousands of
 * steps may add up; a coarse run takes few.
 */
const STEP_SHARE = 2e-3;
const COARSE_STEP_SHARE = 1e-1;
/** From here on a run is coarse. */
const COARSE = 1e-5;
/** A parabola's remainder is judged by its last coefficient, so less of it is let through. */
const PARABOLA_SHARE = 0.1;
/** Of the first step of a leg, in ζ. */
const FIRST_WIDTH = 0.3;
/** How far a wall's flux may be from balance, of the tolerance. */
const FLUX_SHARE = 1e-4;
/** Closer than this to the air outside, the food counts as at rest with it. */
const AT_REST = 1e-12;
/** Work that one answer may cost: conductances of the pack, and layers in them. Some seconds; then the run says so. */
const MOST_EVALUATIONS = 2_000_000;
const MOST_LAYER_EVALUATIONS = 20_000_000;

export interface LegStart {
  leg: number;
  atS: number;
  insideHumidity: number;
  insideOxygenPa: number;
}

export interface RunCounters {
  acceptedSteps: number;
  rejectedSteps: number;
  rateEvaluations: number;
  isStepLimitReached: boolean;
}

/** How far a run got, and where everything stood. */
export interface StorageRun {
  oxygen: OxygenStore;
  moisture: MoistureTracker;
  legStarts: LegStart[];
  counters: RunCounters;
  wallSolutions: number;
  conditions: LegConditions[];
  /** Index of the leg in which the run ended. */
  lastLeg: number;
}

/**
 * Carries a pack along its route: moisture and oxygen together, from day 0 to the horizon or until all is known.
 *
 * Moisture of a leg is one autonomous equation, m_dry dX/dt = M_w K_w p_sat (h_out − a), and a only ever nears h_out. So
 * ζ = ln(z_0/z), z = h_out − a, is taken as the independent variable: dt/dζ = m_dry X′(a)/(M_w p_sat K_w) is smooth and
 * never stiff, however near the food is to rest, and time becomes an integral. It is taken in steps of adaptive width by
 * Clenshaw–Curtis quadrature of degree 8 (chebyshev.ts); what the last two coefficients leave open decides a step.
 * Its points are nested: short legs and gentle steps are content with those of degree 2 or 4. A
 * moisture limit is a known ζ; times are read from the integral's own polynomial. Oxygen rides on the same points
 * (oxygen-store.ts). Where nothing varies, closed forms take the whole leg.
 * Every leg begins anew; the run ends at the horizon, or as soon as no answer can change any more.
 * Cost: 2 to 8 pack conductances per step.
 */
export function runStorage(
  system: StorageSystem,
  firstLegsToSee: number,
  relativeTolerance: number = RELATIVE_TOLERANCE,
): StorageRun {
  return new Runner(system, firstLegsToSee, relativeTolerance).run();
}

/** Overwritten step by step; runs do not overlap, so one will do for all. */
const SCRATCH = new MarchStep();

class Runner {
  private readonly conditions: LegConditions[];
  private readonly oxygen: OxygenStore;
  private readonly moisture: MoistureTracker;
  private readonly counters: RunCounters = {
    acceptedSteps: 0,
    rejectedSteps: 0,
    rateEvaluations: 0,
    isStepLimitReached: false,
  };
  private readonly step = SCRATCH;
  private readonly legStarts: LegStart[] = [];
  private readonly dryMassKg: number;
  private readonly mostEvaluations: number;
  private readonly stepTolerance: number;
  private timeS = 0;
  private lastLeg = 0;
  private begun = 0;
  /** Set where a step is given up before all its points are known. */
  private narrowing = 1;

  constructor(
    private readonly system: StorageSystem,
    private readonly firstLegsToSee: number,
    relativeTolerance: number,
  ) {
    this.stepTolerance = (relativeTolerance >= COARSE ? COARSE_STEP_SHARE : STEP_SHARE) * relativeTolerance;
    this.conditions = conditionsOf(system, FLUX_SHARE * relativeTolerance);
    this.oxygen = new OxygenStore(system, this.conditions[0]);
    this.moisture = new MoistureTracker(system);
    const layers = system.pack.walls.reduce((sum, wall) => sum + wall.layers.length, 0);
    this.mostEvaluations = Math.min(MOST_EVALUATIONS, MOST_LAYER_EVALUATIONS / layers);
    this.dryMassKg = system.food.massKg / (1 + system.food.initialMoisture);
  }

  run(): StorageRun {
    const { legs, isRepeated, horizonS } = this.system;
    let endS = 0;
    while (this.timeS < horizonS) {
      const { begun } = this;
      const index = isRepeated ? begun % legs.length : Math.min(begun, legs.length - 1);
      const isHeld = !isRepeated && index === legs.length - 1;
      endS = isHeld ? horizonS : Math.min(horizonS, endS + legs[index].durationS);
      this.begun += 1;
      this.runLeg(index, begun, endS);
      if (this.counters.isStepLimitReached || this.isAllKnown()) break;
      this.timeS = endS;
    }
    this.oxygen.finish();
    this.moisture.finish();
    const packs = new Set(this.conditions.map((conditions) => conditions.pack));
    let wallSolutions = 0;
    for (const pack of packs) wallSolutions += pack.solutions();
    return {
      oxygen: this.oxygen,
      moisture: this.moisture,
      legStarts: this.legStarts,
      counters: this.counters,
      wallSolutions,
      conditions: this.conditions,
      lastLeg: this.lastLeg,
    };
  }

  /** True once no answer can change any more. */
  private isAllKnown(): boolean {
    const { limits, legs, absorberMol } = this.system;
    return (
      this.begun >= Math.min(this.firstLegsToSee, legs.length) &&
      (limits.oxygen_uptake_mg_per_kg === undefined || this.oxygen.uptakeReachedAtS !== null) &&
      (limits.headspace_oxygen_percent === undefined || this.oxygen.headspaceReachedAtS !== null) &&
      (limits.moisture_max_g_per_g === undefined || this.moisture.maxReachedAtS !== null) &&
      (limits.moisture_min_g_per_g === undefined || this.moisture.minReachedAtS !== null) &&
      this.oxygen.isReported &&
      (absorberMol === 0 || this.oxygen.exhaustedAtS !== null)
    );
  }

  private insideHumidity(): number {
    const { food } = this.system;
    return food.isotherm ? food.isotherm.activity(this.moisture.moisture) : food.insideHumidity;
  }

  private runLeg(index: number, begun: number, endS: number): void {
    const conditions = this.conditions[index];
    this.lastLeg = index;
    this.oxygen.beginLeg(conditions, this.timeS);
    if (begun < this.system.legs.length && this.legStarts.length < this.firstLegsToSee) {
      const inside = this.insideHumidity();
      conditions.pack.conduct(conditions.humidity, inside);
      this.legStarts.push({
        leg: index,
        atS: this.timeS,
        insideHumidity: inside,
        insideOxygenPa: this.oxygen.insidePressure(conditions.pack.oxygen),
      });
    }
    while (this.timeS < endS && !this.counters.isStepLimitReached && !this.isAllKnown()) {
      this.runPiece(conditions, endS);
    }
  }

  private runPiece(conditions: LegConditions, endS: number): void {
    const { isotherm } = this.system.food;
    const { pack, humidity } = conditions;
    const inside = this.insideHumidity();
    const distance = humidity - inside;
    if (isotherm === null || Math.abs(distance) <= AT_REST) {
      this.rest(conditions, inside, endS);
      return;
    }
    pack.conduct(humidity, inside, distance);
    this.counters.rateEvaluations += 1;
    if (pack.water === 0) {
      this.rest(conditions, inside, endS);
      return;
    }
    const held = isotherm.moisture(inside);
    const isPinned =
      inside === 0 ? this.moisture.moisture < held : inside === 1 && this.moisture.moisture > held;
    if (isPinned) this.slide(conditions, { inside, held }, endS);
    else if (isotherm.isLinear && !pack.isWaterHumid && !pack.isOxygenHumid)
      this.decay(conditions, distance, endS);
    else this.march(conditions, distance, endS);
  }

  /** Nothing moves but oxygen. */
  private rest(conditions: LegConditions, inside: number, endS: number): void {
    const { pack, humidity } = conditions;
    pack.conduct(humidity, inside);
    this.counters.rateEvaluations += 1;
    this.oxygen.advanceConstant(pack.oxygen, this.timeS, endS - this.timeS);
    this.moisture.rest(endS);
    this.timeS = endS;
  }

  /** Moisture beyond what the isotherm gives at 0 or 1: activity is held there, so moisture changes evenly. */
  private slide(
    conditions: LegConditions,
    { inside, held }: { inside: number; held: number },
    endS: number,
  ): void {
    const { pack, humidity, saturationPa } = conditions;
    const startS = this.timeS;
    const start = this.moisture.moisture;
    const speed = (WATER_MOLAR_MASS * pack.water * saturationPa * (humidity - inside)) / this.dryMassKg;
    const arrivesS = startS + (held - start) / speed;
    const isArriving = arrivesS <= endS;
    const untilS = isArriving ? arrivesS : endS;
    this.oxygen.advanceConstant(pack.oxygen, startS, untilS - startS);
    this.moisture.advance(isArriving ? held : start + speed * (endS - startS), untilS, {
      whenAt: (moisture) => startS + (moisture - start) / speed,
      moistureAt: (atS) => start + speed * (atS - startS),
    });
    this.timeS = untilS;
  }

  /** Linear isotherm and constant conductances: Labuza's closed form for the whole leg. */
  private decay(conditions: LegConditions, distance: number, endS: number): void {
    const { isotherm } = this.system.food;
    if (isotherm === null) return;
    const { pack, saturationPa } = conditions;
    const startS = this.timeS;
    const start = this.moisture.moisture;
    const slope = isotherm.slope(0);
    const lifetimeS = (this.dryMassKg * slope) / (WATER_MOLAR_MASS * pack.water * saturationPa);
    const moistureAt = (atS: number): number =>
      start - slope * distance * Math.expm1(-(atS - startS) / lifetimeS);
    this.oxygen.advanceConstant(pack.oxygen, startS, endS - startS);
    this.moisture.advance(moistureAt(endS), endS, {
      whenAt: (moisture) => startS - lifetimeS * Math.log1p(-(moisture - start) / (slope * distance)),
      moistureAt,
    });
    this.timeS = endS;
  }

  /** Adaptive steps in ζ until the leg ends or the food is at rest. */
  private march(conditions: LegConditions, startDistance: number, endS: number): void {
    const { pack } = conditions;
    const { step, counters } = this;
    step.startDistance = startDistance;
    let firstPace = this.paceAt(conditions, startDistance);
    let firstOxygen = pack.oxygen;
    let width = Math.min(FIRST_WIDTH, (1.05 * (endS - this.timeS)) / firstPace);
    while (this.timeS < endS && Math.abs(step.startDistance) > AT_REST) {
      if (counters.rateEvaluations >= this.mostEvaluations) {
        counters.isStepLimitReached = true;
        return;
      }
      step.width = Math.min(width, Math.log(Math.abs(step.startDistance) / AT_REST) + 1e-3);
      step.pace[0] = firstPace * step.width;
      step.oxygen[0] = firstOxygen;
      const degree = this.sample(conditions);
      if (degree === 0) {
        counters.rejectedSteps += 1;
        width = step.width * this.narrowing;
        continue;
      }
      const lastPace = step.pace[DEGREE] / step.width;
      const lastOxygen = step.oxygen[DEGREE];
      step.settleTime();
      let error = 0;
      if (degree === DEGREE) {
        error = openEnd(step.paceCoefficients) / (this.stepTolerance * (this.timeS + step.timeAt(1)));
      }
      if (pack.isOxygenHumid) error = Math.max(error, this.oxygen.prepareStep(step, this.stepTolerance));
      // A step that was content with few points may grow: should it grow too far, more points are there to be asked.
      const change = Math.min(4, Math.max(0.15, 0.9 * error ** (-1 / DEGREE)));
      if (error > 1 && step.width > 1e-13) {
        counters.rejectedSteps += 1;
        width = step.width * Math.min(change, 0.7);
        continue;
      }
      counters.acceptedSteps += 1;
      const remaining = endS - this.timeS;
      const isLast = step.timeAt(1) >= remaining;
      let x = isLast ? whereReaches((at) => step.timeAt(at), remaining) : 1;
      if (pack.isOxygenHumid) {
        const regimeX = this.oxygen.regimeEnd(x);
        this.take(step, regimeX, isLast && regimeX === x ? endS : this.timeS + step.timeAt(regimeX));
        x = regimeX;
      } else {
        this.take(step, x, isLast ? endS : this.timeS + step.timeAt(x));
      }
      step.startDistance = step.distanceAt(x);
      if (this.isAllKnown()) return;
      if (x === 1) {
        firstPace = lastPace;
        firstOxygen = lastOxygen;
      } else if (this.timeS < endS) {
        firstPace = this.paceAt(conditions, step.startDistance);
        firstOxygen = pack.oxygen;
      }
      width = Math.min(step.width * change, (1.05 * (endS - this.timeS)) / firstPace);
    }
    if (this.timeS < endS) this.rest(conditions, this.insideHumidity(), endS);
  }

  /**
   * Fills the step's points, asking the pack at as few as the tolerance allows; gives the degree that was enough. For
   * the highest it is not yet known whether it is: the step's own coefficients tell. 0: not even that would be enough.
   */
  private sample(conditions: LegConditions): number {
    const { pace, oxygen } = this.step;
    const { isOxygenHumid } = conditions.pack;
    this.sampleAt(conditions, 8);
    this.sampleAt(conditions, 4);
    let open = this.openPart(openEndOfTwo(pace), isOxygenHumid ? openEndOfTwo(oxygen) : 0);
    if (this.isHopeless(open, 2)) return 0;
    if (open <= PARABOLA_SHARE) {
      fillFromTwo(pace);
      fillFromTwo(oxygen);
      return 2;
    }
    this.sampleAt(conditions, 2);
    this.sampleAt(conditions, 6);
    open = this.openPart(openEndOfFour(pace), isOxygenHumid ? openEndOfFour(oxygen) : 0);
    if (this.isHopeless(open, 4)) return 0;
    if (open <= 1) {
      fillFromFour(pace);
      fillFromFour(oxygen);
      return 4;
    }
    this.sampleAt(conditions, 7);
    this.sampleAt(conditions, 5);
    this.sampleAt(conditions, 3);
    this.sampleAt(conditions, 1);
    return DEGREE;
  }

  /**
   * Coefficients of a smooth function fall geometrically: what degree 2 or 4 leaves open foretells what 8 will. Notes
   * how much narrower the step should be.
   */
  private isHopeless(open: number, degree: number): boolean {
    const foretold = open * this.stepTolerance;
    const wanted = this.stepTolerance ** (degree / DEGREE);
    if (foretold <= 3 * wanted) return false;
    this.narrowing = Math.max(0.1, 0.8 * (wanted / foretold) ** (1 / degree));
    return this.step.width > 1e-12;
  }

  private sampleAt(conditions: LegConditions, node: number): void {
    const { step } = this;
    step.pace[node] = this.paceAt(conditions, step.nodeDistance(node)) * step.width;
    step.oxygen[node] = conditions.pack.oxygen;
  }

  /** What is left open of time and oxygen by a few points, over the tolerance; from node 0, 4 and 8. */
  private openPart(openPace: number, openOxygen: number): number {
    const { pace, oxygen } = this.step;
    const stepS = (pace[0] + 4 * pace[4] + pace[8]) / 6;
    const ofTime = openPace / (this.timeS + stepS);
    if (openOxygen === 0) return ofTime / this.stepTolerance;
    const mean = (oxygen[0] + 4 * oxygen[4] + oxygen[8]) / 6;
    const ofOxygen = (openOxygen / mean + openPace / stepS) * this.oxygen.shareOf(mean * stepS);
    return Math.max(ofTime, ofOxygen) / this.stepTolerance;
  }

  /** dt/dζ [s] at a distance from rest; leaves the pack's conductances behind. */
  private paceAt(conditions: LegConditions, distance: number): number {
    const { isotherm } = this.system.food;
    if (isotherm === null) return Infinity;
    const { pack, humidity, saturationPa } = conditions;
    const inside = Math.min(1, Math.max(0, humidity - distance));
    pack.conduct(humidity, inside, distance);
    this.counters.rateEvaluations += 1;
    return (this.dryMassKg * isotherm.slope(inside)) / (WATER_MOLAR_MASS * saturationPa * pack.water);
  }

  /** Books a step up to x, which ends at `untilS`. */
  private take(step: MarchStep, x: number, untilS: number): void {
    const { isotherm } = this.system.food;
    if (isotherm === null) return;
    const startS = this.timeS;
    const { humidity, pack } = this.conditions[this.lastLeg];
    const moistureOf = (distance: number): number =>
      isotherm.moisture(Math.min(1, Math.max(0, humidity - distance)));
    if (pack.isOxygenHumid) this.oxygen.commitStep(step, x, startS);
    else this.oxygen.advanceConstant(pack.oxygen, startS, untilS - startS);
    this.moisture.advance(moistureOf(step.distanceAt(x)), untilS, {
      whenAt: (moisture) => {
        const distance = humidity - isotherm.activity(moisture);
        const at = Math.log(step.startDistance / distance) / step.width;
        return startS + step.timeAt(at > 0 ? Math.min(at, x) : 0);
      },
      moistureAt: (atS) =>
        moistureOf(step.distanceAt(whereReaches((part) => step.timeAt(part * x), atS - startS) * x)),
    });
    this.timeS = untilS;
  }
}
