import { DEGREE, DIFFERENTIATION, fit, integrate, openEnd, valueAt, whereReaches } from './chebyshev';
import type { MarchStep } from './march-step';
import { solveDense } from './dense-solve';
import type { LegConditions, StorageSystem } from './storage-system';

export interface OxygenReport {
  uptakeMol: Float64Array;
  headspacePa: Float64Array;
  absorberMol: Float64Array;
}

/** Oxygen in headspace and food, mol. */
interface Contents {
  headspaceMol: number;
  uptakeMol: number;
}

/** Own constants: an import is looked up anew at every use, which inner loops feel. */
const LAST = DEGREE;
const COUNT = DEGREE + 1;
const SLOPES = DIFFERENTIATION;

/** Holds one prepared step; runs do not overlap, so one will do for all. */
const SCRATCH = {
  flow: new Float64Array(COUNT),
  flowCoefficients: new Float64Array(COUNT),
  flowIntegral: new Float64Array(COUNT + 1),
  content: new Float64Array(COUNT),
  contentCoefficients: new Float64Array(COUNT),
  matrix: new Float64Array(LAST * COUNT),
};

/**
 * Oxygen in headspace, food and absorber [mol], advanced over pieces of a leg.
 *
 * dn/dt = K(p_out − p_in) − r, p_in = nRT/V. The modes: 'at_once' p_in = 0, what enters is taken up; 'none' r = 0;
 * 'rate' r = k·m·p_in, without headspace p_in = K p_out/(K + k m) at every moment. An absorber takes what enters, with
 * p_in = 0, until it is used up; the mode begins only then.
 *
 * Constant K: closed forms. K that follows the humidity: 'at_once', the absorber and 'rate' without headspace are
 * integrals; 'none' is exact once ∫K dt is known, since p_out is constant within a leg; 'rate' with headspace is a
 * linear equation, solved by collocation at the step's points (its last point is one of them, so that fast reactions
 * in a small headspace cannot make it swing). Limits are found by root search on these forms.
 */
export class OxygenStore {
  headspaceMol = 0;
  uptakeMol = 0;
  absorberMol = 0;
  exhaustedAtS: number | null = null;
  uptakeReachedAtS: number | null = null;
  headspaceReachedAtS: number | null = null;
  readonly report: OxygenReport;

  private readonly mode;
  private readonly hasHeadspace: boolean;
  private readonly uptakeLimit: number | undefined;
  private readonly headspaceLimitPa: number | undefined;
  private readonly reportS: number[];
  private nextReport = 0;
  private conditions: LegConditions | null = null;

  /** What passed so far, mol: the scale against which step errors are judged. */
  private passedMol = 0;
  private isUsedUpInStep = false;
  private readonly flow = SCRATCH.flow;
  private readonly flowCoefficients = SCRATCH.flowCoefficients;
  private readonly flowIntegral = SCRATCH.flowIntegral;
  private readonly content = SCRATCH.content;
  private readonly contentCoefficients = SCRATCH.contentCoefficients;
  private readonly matrix = SCRATCH.matrix;

  constructor(system: StorageSystem, atFirstLeg: LegConditions) {
    this.mode = system.food.oxygenMode;
    this.hasHeadspace = system.pack.headspaceM3 > 0;
    this.uptakeLimit = system.limits.oxygen_uptake_mg_per_kg;
    this.headspaceLimitPa = system.limits.headspace_oxygen_percent;
    this.reportS = system.reportS;
    const reports = system.reportS.length;
    this.report = {
      uptakeMol: new Float64Array(reports),
      headspacePa: new Float64Array(reports),
      absorberMol: new Float64Array(reports),
    };
    let starting = this.hasHeadspace
      ? (system.pack.startingOxygenFraction * system.totalPressurePa) / atFirstLeg.pressurePerMol
      : 0;
    if (system.absorberMol > 0) {
      const taken = Math.min(starting, system.absorberMol);
      starting -= taken;
      this.absorberMol = system.absorberMol - taken;
      if (this.absorberMol === 0) this.exhaustedAtS = 0;
    }
    if (this.mode === 'at_once') this.uptakeMol = starting;
    else this.headspaceMol = starting;
    this.noteUptake(0);
  }

  get isAbsorbing(): boolean {
    return this.absorberMol > 0;
  }

  /** Headspace oxygen pressure now [Pa]; `conductance` serves a pack without headspace. */
  insidePressure(conductance: number): number {
    const conditions = this.inLeg();
    if (this.isAbsorbing || this.mode === 'at_once') return 0;
    if (this.hasHeadspace) return this.headspaceMol * conditions.pressurePerMol;
    if (this.mode === 'none') return conductance > 0 ? conditions.outsideOxygenPa : 0;
    return (conductance * conditions.outsideOxygenPa) / (conductance + conditions.reactionSi);
  }

  headspacePressure(): number {
    return this.headspaceMol * this.inLeg().pressurePerMol;
  }

  /** Moles carry over, so the pressure steps with temperature; a step past the limit counts. */
  beginLeg(conditions: LegConditions, atS: number): void {
    this.conditions = conditions;
    this.noteHeadspace(atS);
    if (atS === 0)
      while (this.reportIsDue(0)) this.writeReport(this.headspaceMol, this.uptakeMol, this.absorberMol);
  }

  /** Whatever is still to be reported holds the present values. */
  finish(): void {
    while (this.nextReport < this.reportS.length) {
      this.writeReport(this.headspaceMol, this.uptakeMol, this.absorberMol);
    }
  }

  get isReported(): boolean {
    return this.nextReport >= this.reportS.length;
  }

  /** A stretch of constant conductance K [mol/(s·Pa)]. */
  advanceConstant(conductance: number, fromS: number, durationS: number): void {
    const { outsideOxygenPa } = this.inLeg();
    let from = fromS;
    let duration = durationS;
    if (this.isAbsorbing) {
      const rate = conductance * outsideOxygenPa;
      const untilUsedUp = rate > 0 ? this.absorberMol / rate : Infinity;
      const absorbing = Math.min(untilUsedUp, duration);
      while (this.reportIsDue(from + absorbing)) {
        const left = this.absorberMol - rate * (this.reportS[this.nextReport] - from);
        this.writeReport(0, this.uptakeMol, Math.max(0, left));
      }
      this.passedMol += rate * absorbing;
      if (untilUsedUp > duration) {
        this.absorberMol = Math.max(Number.MIN_VALUE, this.absorberMol - rate * duration);
        return;
      }
      this.absorberMol = 0;
      from += absorbing;
      duration -= absorbing;
      this.exhaustedAtS = from;
      if (!(duration > 0)) return;
    }
    const start = { headspaceMol: this.headspaceMol, uptakeMol: this.uptakeMol };
    const after = (seconds: number): Contents => this.afterConstant(conductance, start, seconds);
    const end = after(duration);
    if (
      this.uptakeLimit !== undefined &&
      this.uptakeReachedAtS === null &&
      end.uptakeMol >= this.uptakeLimit
    ) {
      this.uptakeReachedAtS = from + crossing((s) => after(s).uptakeMol, this.uptakeLimit, duration);
    }
    const limitMol = this.headspaceLimitMol();
    if (limitMol !== null && this.headspaceReachedAtS === null && end.headspaceMol >= limitMol) {
      this.headspaceReachedAtS = from + crossing((s) => after(s).headspaceMol, limitMol, duration);
    }
    while (this.reportIsDue(from + duration)) {
      const then = after(Math.max(0, this.reportS[this.nextReport] - from));
      this.writeReport(then.headspaceMol, then.uptakeMol, 0);
    }
    this.passedMol += conductance * outsideOxygenPa * duration;
    this.headspaceMol = end.headspaceMol;
    this.uptakeMol = end.uptakeMol;
  }

  /** Headspace and uptake [mol] after `seconds` of constant conductance, absorber aside. Closed forms. */
  private afterConstant(conductance: number, start: Contents, seconds: number): Contents {
    const { headspaceMol: headspace, uptakeMol: uptake } = start;
    const { outsideOxygenPa, reactionSi, pressurePerMol } = this.inLeg();
    if (this.mode === 'at_once') {
      return { headspaceMol: 0, uptakeMol: uptake + conductance * outsideOxygenPa * seconds };
    }
    if (!this.hasHeadspace) {
      if (this.mode === 'none' || conductance === 0) return { headspaceMol: 0, uptakeMol: uptake };
      const inside = (conductance * outsideOxygenPa) / (conductance + reactionSi);
      return { headspaceMol: 0, uptakeMol: uptake + reactionSi * inside * seconds };
    }
    const sink = this.mode === 'rate' ? reactionSi : 0;
    const decay = (conductance + sink) * pressurePerMol;
    if (decay === 0) return { headspaceMol: headspace, uptakeMol: uptake };
    const balance = (conductance * outsideOxygenPa) / decay;
    const spent = -Math.expm1(-decay * seconds);
    const headspaceMol = headspace + (balance - headspace) * spent;
    if (sink === 0) return { headspaceMol, uptakeMol: uptake };
    const mean = balance * seconds + (headspace - balance) * (spent / decay);
    return { headspaceMol, uptakeMol: uptake + sink * pressurePerMol * mean };
  }

  /**
   * Readies a step whose conductance follows the humidity. Gives the error it may make over what is asked
   * (accept at 1 or below).
   */
  prepareStep(step: MarchStep, tolerance: number): number {
    const { outsideOxygenPa, reactionSi, pressurePerMol } = this.inLeg();
    const isReacting = this.mode === 'rate' && !this.isAbsorbing;
    let contentError = 0;
    if (isReacting && this.hasHeadspace) {
      this.collocate(step);
      fit(this.content, this.contentCoefficients);
      let largest = 0;
      for (let k = 0; k < COUNT; k++) largest = Math.max(largest, Math.abs(this.content[k]));
      contentError = largest > 0 ? openEnd(this.contentCoefficients) / (tolerance * largest) : 0;
      for (let k = 0; k < COUNT; k++)
        this.flow[k] = step.pace[k] * reactionSi * pressurePerMol * this.content[k];
    } else if (isReacting) {
      for (let k = 0; k < COUNT; k++) {
        const conductance = step.oxygen[k];
        const share = conductance > 0 ? (conductance * reactionSi) / (conductance + reactionSi) : 0;
        this.flow[k] = step.pace[k] * share * outsideOxygenPa;
      }
    } else {
      for (let k = 0; k < COUNT; k++) this.flow[k] = step.pace[k] * step.oxygen[k] * outsideOxygenPa;
    }
    fit(this.flow, this.flowCoefficients);
    integrate(this.flowCoefficients, this.flowIntegral);
    const scale = this.passedMol + Math.abs(valueAt(this.flowIntegral, 1));
    const flowError = scale > 0 ? openEnd(this.flowCoefficients) / (tolerance * scale) : 0;
    return Math.max(flowError, contentError);
  }

  /**
   * How much a relative error in a step's oxygen weighs in what passed so far, or in what the headspace holds;
   * `admittanceS` is ∫K dt of the step, mol/Pa.
   */
  shareOf(admittanceS: number): number {
    const stepMol = admittanceS * this.inLeg().outsideOxygenPa;
    if (!(stepMol > 0)) return 0;
    const held = this.hasHeadspace && this.mode !== 'at_once' ? this.headspaceMol : Infinity;
    return stepMol / (Math.min(this.passedMol, held) + stepMol);
  }

  /** Where, up to x, the absorber is used up, and with it the step must end; x if it is not. */
  regimeEnd(x: number): number {
    this.isUsedUpInStep = this.isAbsorbing && this.passedAt(x) >= this.absorberMol;
    if (!this.isUsedUpInStep) return x;
    return Math.min(
      x,
      whereReaches((at) => this.passedAt(at), this.absorberMol),
    );
  }

  /** Takes the prepared step up to x; `fromS` is when it began. */
  commitStep(step: MarchStep, x: number, fromS: number): void {
    const untilS = fromS + step.timeAt(x);
    if (this.isAbsorbing) {
      while (this.reportIsDue(untilS)) {
        this.writeReport(
          0,
          this.uptakeMol,
          Math.max(0, this.absorberMol - this.passedAt(this.reportX(step, fromS))),
        );
      }
      const passed = this.passedAt(x);
      this.passedMol += passed;
      this.absorberMol = Math.max(0, this.absorberMol - passed);
      if (this.isUsedUpInStep) {
        this.absorberMol = 0;
        this.exhaustedAtS = untilS;
      }
      return;
    }
    const takes = this.mode !== 'none';
    const uptakeAt = (at: number): number => (takes ? this.uptakeMol + this.passedAt(at) : this.uptakeMol);
    if (this.uptakeLimit !== undefined && this.uptakeReachedAtS === null && uptakeAt(x) >= this.uptakeLimit) {
      this.uptakeReachedAtS =
        fromS + step.timeAt(whereReaches((at) => uptakeAt(at * x), this.uptakeLimit) * x);
    }
    const limitMol = this.headspaceLimitMol();
    if (limitMol !== null && this.headspaceReachedAtS === null) {
      const at = this.firstReach(limitMol, x);
      if (at !== null) this.headspaceReachedAtS = fromS + step.timeAt(at);
    }
    while (this.reportIsDue(untilS)) {
      const at = this.reportX(step, fromS);
      this.writeReport(this.contentAt(at), uptakeAt(at), 0);
    }
    const headspace = this.contentAt(x);
    this.uptakeMol = uptakeAt(x);
    this.headspaceMol = headspace;
    this.passedMol += Math.abs(this.passedAt(x));
  }

  private passedAt(x: number): number {
    return x === 0 ? 0 : valueAt(this.flowIntegral, x);
  }

  /** Headspace oxygen [mol] within the prepared step. */
  private contentAt(x: number): number {
    if (!this.hasHeadspace || this.mode === 'at_once') return 0;
    if (this.mode === 'rate')
      return x === 0 ? this.headspaceMol : Math.max(0, valueAt(this.contentCoefficients, x));
    const { outsideOxygenPa, pressurePerMol } = this.inLeg();
    const balance = outsideOxygenPa / pressurePerMol;
    const exponent = (pressurePerMol * this.passedAt(x)) / outsideOxygenPa;
    return this.headspaceMol - (balance - this.headspaceMol) * Math.expm1(-exponent);
  }

  /** First x at which the headspace reaches a limit; its course may have a summit within the step. */
  private firstReach(limitMol: number, x: number): number | null {
    const pieces = 32;
    let before = 0;
    for (let piece = 1; piece <= pieces; piece++) {
      const at = (x * piece) / pieces;
      if (this.contentAt(at) >= limitMol) {
        const width = at - before;
        return before + width * whereReaches((part) => this.contentAt(before + width * part), limitMol);
      }
      before = at;
    }
    return null;
  }

  /** dn/dx = pace·(K p_out − (K + k m)(RT/V) n) at every node but the first. */
  private collocate(step: MarchStep): void {
    const { outsideOxygenPa, reactionSi, pressurePerMol } = this.inLeg();
    const width = COUNT;
    for (let k = 1; k <= LAST; k++) {
      const row = (k - 1) * width;
      for (let j = 1; j <= LAST; j++) this.matrix[row + j - 1] = SLOPES[k * COUNT + j];
      const conductance = step.oxygen[k];
      this.matrix[row + k - 1] += step.pace[k] * (conductance + reactionSi) * pressurePerMol;
      this.matrix[row + LAST] =
        step.pace[k] * conductance * outsideOxygenPa - SLOPES[k * COUNT] * this.headspaceMol;
    }
    solveDense(this.matrix, LAST);
    this.content[0] = this.headspaceMol;
    for (let k = 1; k <= LAST; k++) this.content[k] = this.matrix[(k - 1) * width + LAST];
  }

  private headspaceLimitMol(): number | null {
    if (this.headspaceLimitPa === undefined || !this.hasHeadspace) return null;
    return this.headspaceLimitPa / this.inLeg().pressurePerMol;
  }

  private noteUptake(atS: number): void {
    if (this.uptakeLimit !== undefined && this.uptakeMol >= this.uptakeLimit) this.uptakeReachedAtS = atS;
  }

  private noteHeadspace(atS: number): void {
    if (this.headspaceLimitPa === undefined || this.headspaceReachedAtS !== null) return;
    if (this.headspacePressure() >= this.headspaceLimitPa) this.headspaceReachedAtS = atS;
  }

  private reportIsDue(untilS: number): boolean {
    return this.nextReport < this.reportS.length && this.reportS[this.nextReport] <= untilS;
  }

  private reportX(step: MarchStep, fromS: number): number {
    const target = this.reportS[this.nextReport] - fromS;
    return whereReaches((at) => step.timeAt(at), target);
  }

  private writeReport(headspaceMol: number, uptakeMol: number, absorberMol: number): void {
    this.report.headspacePa[this.nextReport] = headspaceMol * this.inLeg().pressurePerMol;
    this.report.uptakeMol[this.nextReport] = uptakeMol;
    this.report.absorberMol[this.nextReport] = absorberMol;
    this.nextReport += 1;
  }

  private inLeg(): LegConditions {
    if (!this.conditions) throw new Error('The oxygen store is asked before its first leg has begun.');
    return this.conditions;
  }
}

/**
 * When, within `duration`, a rising value reaches a target. The bracket is first narrowed by sixteenths: a crossing may
 * lie many orders of magnitude before the end of a long leg, and must not lose its digits to it.
 */
function crossing(valueAfter: (seconds: number) => number, target: number, duration: number): number {
  if (valueAfter(0) >= target) return 0;
  let high = duration;
  while (high > duration * 1e-18 && valueAfter(high / 16) >= target) high /= 16;
  return high * whereReaches((part) => valueAfter(high * part), target);
}
