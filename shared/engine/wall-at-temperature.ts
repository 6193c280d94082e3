import {
  bareSideResistance,
  coveredSideResistance,
  diffusivityInAir,
  holeResistance,
  OXYGEN_IN_AIR_20C,
  WATER_IN_AIR_20C,
} from './hole';
import type { HumidityCurve, Span } from './humidity-curve';
import { permeanceAtTemperature, type Layer } from './layer';

type Gas = 'oxygen' | 'water';

/** One side of a hole: the layers that cover it, none where it is bare. */
interface HoleSide {
  cover: number[];
  thicknessM: number;
  radiusM: number;
  bareResistance: Record<Gas, number>;
}

/** A layer whose holes are open, with the layers that cover them on either side. */
interface PiercedLayer {
  index: number;
  densityPerM2: number;
  holeResistance: Record<Gas, number>;
  outside: HoleSide;
  inside: HoleSide;
}

/** Below this span a layer counts as lying at one humidity. */
const NARROW_SPAN = 1e-13;

/**
 * One wall at one temperature, made ready for many humidities: layers in series, outside face to inside face.
 *
 * Water first: J/p_sat = g_i ∫f_w dh + d_i Δh in every layer (g its own conductance, d that of its holes), so the
 * flux is the root of Σ rise_i(J) = Δh. It is searched in ln J by Newton's method inside a bracket (Σ rise is
 * monotone, and linear in these logarithms when nothing depends on humidity), beginning from the last solution. The
 * layers are walked from the drier to the moister face, in rises and not in humidities: where curves go up, as they
 * do, that keeps rounding from growing, and it keeps all digits when both faces are nearly alike.
 * Then oxygen along that profile: R = (1/g_o) · ∫(f_w/f_o)dh / ∫f_w dh. Source: Fick's first law.
 * Cost: about 1 µs per layer with a curve and iteration; nothing is allocated in `solve`.
 */
export class WallAtTemperature {
  readonly count: number;
  readonly temperatureK: number;
  /** A foil without holes lies in the wall: nothing passes. */
  readonly isTight: boolean;
  /** Whether the wall's permeance to that gas depends on the humidities at its faces. */
  readonly isWaterHumid: boolean;
  readonly isOxygenHumid: boolean;

  /** Results of the last `solve`, mol/(m²·s·Pa). */
  waterPermeance = 0;
  oxygenPermeance = 0;
  /** Rise of humidity over each layer (of the drier side's size, without sign), and the humidity it begins at. */
  readonly rise: Float64Array;
  readonly driestHumidity: Float64Array;
  /** m²·s·Pa/mol; Infinity for a foil without holes. */
  readonly waterResistance: Float64Array;
  readonly oxygenResistance: Float64Array;

  /** How many fluxes were searched so far. */
  solutions = 0;

  private readonly ownWater: Float64Array;
  private readonly ownOxygen: Float64Array;
  private readonly holesWater: Float64Array;
  private readonly holesOxygen: Float64Array;
  private readonly waterCurves: (HumidityCurve | null)[];
  private readonly oxygenCurves: (HumidityCurve | null)[];
  /** f_w/f_o of layers whose oxygen feels humidity. */
  private readonly quotients: (HumidityCurve | null)[];
  private readonly pierced: PiercedLayer[];
  private readonly hasWaterCurve: boolean;
  private readonly doCoversFeelHumidity: boolean;
  private readonly span: Span = { own: 0, parallel: 0, startFactor: 1, endFactor: 1 };
  /** The flux is taken as found once a correction is smaller than this, relatively; 0: to the last digit. */
  private readonly fluxTolerance: number;
  /** Σ of the layers' resistances at their curves' lowest and highest factors: what the flux can be at most and least. */
  private mostResistance = 0;
  private leastResistance = 0;
  private riseSlope = 0;
  /** The last two solutions, from which the next is guessed. */
  private lastPermeance = 0;
  private lastDriest = 0;
  private lastSpan = 0;
  private permeancePerSpan = 0;

  constructor(layers: readonly Layer[], temperatureK: number, fluxTolerance = 0) {
    const count = layers.length;
    this.count = count;
    this.temperatureK = temperatureK;
    this.fluxTolerance = fluxTolerance;
    this.rise = new Float64Array(count);
    this.driestHumidity = new Float64Array(count);
    this.waterResistance = new Float64Array(count);
    this.oxygenResistance = new Float64Array(count);
    this.ownWater = new Float64Array(count);
    this.ownOxygen = new Float64Array(count);
    this.holesWater = new Float64Array(count);
    this.holesOxygen = new Float64Array(count);
    this.waterCurves = [];
    this.oxygenCurves = [];
    this.quotients = [];
    this.pierced = [];
    let isTight = false;
    let hasWaterCurve = false;
    let hasOxygenCurve = false;
    for (let i = 0; i < count; i++) {
      const layer = layers[i];
      const { water, oxygen } = layer;
      const waterCurve = water ? water.curve : null;
      const oxygenCurve = oxygen ? oxygen.curve : null;
      this.waterCurves.push(waterCurve);
      this.oxygenCurves.push(oxygenCurve);
      this.quotients.push(layer.waterOverOxygen);
      if (waterCurve) hasWaterCurve = true;
      if (oxygenCurve) hasOxygenCurve = true;
      if (water) this.ownWater[i] = permeanceAtTemperature(water, temperatureK);
      if (oxygen) this.ownOxygen[i] = permeanceAtTemperature(oxygen, temperatureK);
      if (layer.defects) this.pierced.push(pierce(layers, i, temperatureK));
      else if (layer.kind === 'foil') isTight = true;
    }
    this.isTight = isTight;
    this.hasWaterCurve = hasWaterCurve;
    const isWaterCovered = this.isCurveOverHole(this.waterCurves);
    const isOxygenCovered = this.isCurveOverHole(this.oxygenCurves);
    this.doCoversFeelHumidity = isWaterCovered || isOxygenCovered;
    this.isWaterHumid = !isTight && (hasWaterCurve || isWaterCovered);
    this.isOxygenHumid = !isTight && (isOxygenCovered || hasOxygenCurve);
    this.updateHoles(0, 0);
  }

  private isCurveOverHole(curves: (HumidityCurve | null)[]): boolean {
    for (const { outside, inside } of this.pierced) {
      if (outside.cover.some((i) => curves[i] !== null) || inside.cover.some((i) => curves[i] !== null)) {
        return true;
      }
    }
    return false;
  }

  /**
   * Permeances between two humidities [0…1]. `difference` = outside − inside may be given where it is known to more
   * digits than the two humidities.
   */
  solve(outside: number, inside: number, difference: number = outside - inside): void {
    if (this.doCoversFeelHumidity) this.updateHoles(outside, inside);
    if (this.isTight) {
      this.waterPermeance = 0;
      this.oxygenPermeance = 0;
      this.settleTight();
      return;
    }
    this.solutions += 1;
    const span = Math.abs(difference);
    const isDryInside = difference >= 0;
    const driest = isDryInside ? inside : outside;
    this.waterPermeance = span === 0 ? this.restAt(driest) : this.fluxOver(span, driest, isDryInside) / span;
    this.oxygenPermeance = this.oxygenAlong();
  }

  /** Equal humidities: every layer at h, permeance the limit 1/Σ(1/(g f(h) + d)). */
  private restAt(h: number): number {
    let sum = 0;
    for (let i = 0; i < this.count; i++) {
      const curve = this.waterCurves[i];
      const resistance = 1 / (this.ownWater[i] * (curve ? curve.at(h) : 1) + this.holesWater[i]);
      this.driestHumidity[i] = h;
      this.rise[i] = 0;
      this.waterResistance[i] = resistance;
      sum += resistance;
    }
    return 1 / sum;
  }

  /** Flux over saturation pressure [mol/(m²·s·Pa)] at which the layers' rises add to `span`. */
  private fluxOver(span: number, driest: number, isDryInside: boolean): number {
    if (!this.hasWaterCurve) {
      const flux = span / this.leastResistance;
      this.walk(flux, driest, isDryInside);
      for (let i = 0; i < this.count; i++) this.waterResistance[i] = this.rise[i] / flux;
      return flux;
    }
    let lowFlux = (span / this.mostResistance) * (1 - 1e-12);
    let highFlux = (span / this.leastResistance) * (1 + 1e-12);
    let flux = this.guess(span) * span;
    if (!(flux > lowFlux && flux < highFlux)) {
      flux = this.lastPermeance * span;
      if (!(flux > lowFlux && flux < highFlux)) flux = this.fluxAtMiddle(driest, span);
    }
    for (let iteration = 0; iteration < 200; iteration++) {
      const total = this.walk(flux, driest, isDryInside);
      const ratio = total / span;
      if (ratio > 1) highFlux = flux;
      else lowFlux = flux;
      if (Math.abs(ratio - 1) < 2e-15) break;
      const correction = (-Math.log(ratio) * total) / (flux * this.riseSlope);
      const next = flux * Math.exp(correction);
      if (Math.abs(next - flux) <= 1e-15 * flux) break;
      const isWithin = next > lowFlux && next < highFlux;
      flux = isWithin ? next : Math.sqrt(lowFlux) * Math.sqrt(highFlux);
      // Newton's method doubles the digits: what is left after a correction this small is its square.
      if (isWithin && Math.abs(correction) <= this.fluxTolerance) break;
      if (highFlux - lowFlux <= 2e-16 * highFlux) break;
    }
    for (let i = 0; i < this.count; i++) this.waterResistance[i] = this.rise[i] / flux;
    const permeance = flux / span;
    this.permeancePerSpan =
      driest === this.lastDriest || driest + span === this.lastDriest + this.lastSpan
        ? (permeance - this.lastPermeance) / (span - this.lastSpan)
        : 0;
    this.lastPermeance = permeance;
    this.lastDriest = driest;
    this.lastSpan = span;
    return flux;
  }

  /** As if the whole wall lay at the middle of its humidities: where a search begins that has nothing to go by. */
  private fluxAtMiddle(driest: number, span: number): number {
    const middle = driest + span / 2;
    let sum = 0;
    for (let i = 0; i < this.count; i++) {
      const curve = this.waterCurves[i];
      sum += 1 / (this.ownWater[i] * (curve ? curve.at(middle) : 1) + this.holesWater[i]);
    }
    return span / sum;
  }

  /** Permeance to begin from: the last, or along the line through the last two where one face stood still. */
  private guess(span: number): number {
    const moved = this.permeancePerSpan * (span - this.lastSpan);
    return Number.isFinite(moved) ? this.lastPermeance + moved : this.lastPermeance;
  }

  /** Total rise for a flux; leaves each layer's span, and the derivative of the total by the flux in riseSlope. */
  private walk(flux: number, driest: number, isDryInside: boolean): number {
    let total = 0;
    let slope = 0;
    for (let k = 0; k < this.count; k++) {
      const i = isDryInside ? this.count - 1 - k : k;
      const curve = this.waterCurves[i];
      const own = this.ownWater[i];
      const holes = this.holesWater[i];
      const from = driest + total;
      let rise: number;
      if (curve === null) {
        const resistance = 1 / (own + holes);
        rise = flux * resistance;
        slope += resistance;
      } else {
        this.span.own = own;
        this.span.parallel = holes;
        rise = curve.riseFor(this.span, from, flux);
        slope = (slope * (own * this.span.startFactor + holes) + 1) / (own * this.span.endFactor + holes);
      }
      this.driestHumidity[i] = from;
      this.rise[i] = rise;
      total += rise;
    }
    this.riseSlope = slope;
    return total;
  }

  private oxygenAlong(): number {
    let sum = 0;
    for (let i = 0; i < this.count; i++) {
      const quotient = this.quotients[i];
      let own = this.ownOxygen[i];
      if (quotient !== null && own > 0) {
        const from = this.driestHumidity[i];
        const rise = this.rise[i];
        const waterCurve = this.waterCurves[i];
        if (rise <= NARROW_SPAN) own /= quotient.at(from) / (waterCurve ? waterCurve.at(from) : 1);
        else own /= quotient.integral(from, rise) / (waterCurve ? waterCurve.integral(from, rise) : rise);
      }
      const resistance = 1 / (own + this.holesOxygen[i]);
      this.oxygenResistance[i] = resistance;
      sum += resistance;
    }
    return 1 / sum;
  }

  private settleTight(): void {
    for (let i = 0; i < this.count; i++) {
      const isFoil = this.ownWater[i] === 0 && this.holesWater[i] === 0;
      this.waterResistance[i] = isFoil ? Infinity : 0;
      this.oxygenResistance[i] = isFoil ? Infinity : 0;
      this.rise[i] = 0;
    }
  }

  /** n·G of every pierced layer; covers are taken at the humidity of the face they lie towards. */
  private updateHoles(outside: number, inside: number): void {
    for (const hole of this.pierced) {
      this.holesWater[hole.index] =
        hole.densityPerM2 / this.holeResistance(hole, 'water', { outside, inside });
      this.holesOxygen[hole.index] =
        hole.densityPerM2 / this.holeResistance(hole, 'oxygen', { outside, inside });
    }
    let most = 0;
    let least = 0;
    for (let i = 0; i < this.count; i++) {
      const curve = this.waterCurves[i];
      most += 1 / (this.ownWater[i] * (curve ? curve.minFactor : 1) + this.holesWater[i]);
      least += 1 / (this.ownWater[i] * (curve ? curve.maxFactor : 1) + this.holesWater[i]);
    }
    this.mostResistance = most;
    this.leastResistance = least;
  }

  private holeResistance(
    hole: PiercedLayer,
    gas: Gas,
    humidity: { outside: number; inside: number },
  ): number {
    return (
      this.sideResistance(hole.outside, gas, humidity.outside) +
      hole.holeResistance[gas] +
      this.sideResistance(hole.inside, gas, humidity.inside)
    );
  }

  private sideResistance(side: HoleSide, gas: Gas, humidity: number): number {
    if (side.cover.length === 0) return side.bareResistance[gas];
    const own = gas === 'water' ? this.ownWater : this.ownOxygen;
    const curves = gas === 'water' ? this.waterCurves : this.oxygenCurves;
    let sum = 0;
    for (const index of side.cover) {
      const curve = curves[index];
      sum += 1 / (own[index] * (curve ? curve.at(humidity) : 1));
    }
    return coveredSideResistance(sum, side.thicknessM, side.radiusM);
  }
}

/** A cover ends at the face, or before the next foil or layer with holes of its own. */
function pierce(layers: readonly Layer[], index: number, temperatureK: number): PiercedLayer {
  const layer = layers[index];
  const defects = layer.defects ?? { densityPerM2: 0, radiusM: 1 };
  const collect = (step: 1 | -1): number[] => {
    const cover: number[] = [];
    for (let i = index + step; i >= 0 && i < layers.length; i += step) {
      if (layers[i].kind === 'foil' || layers[i].defects) break;
      cover.push(i);
    }
    return cover;
  };
  const oxygenInAir = diffusivityInAir(OXYGEN_IN_AIR_20C, temperatureK);
  const waterInAir = diffusivityInAir(WATER_IN_AIR_20C, temperatureK);
  const { densityPerM2, radiusM } = defects;
  const sideOf = (cover: number[]): HoleSide => ({
    cover,
    thicknessM: cover.reduce((sum, i) => sum + layers[i].thicknessM, 0),
    radiusM,
    bareResistance: {
      oxygen: bareSideResistance(radiusM, oxygenInAir, temperatureK),
      water: bareSideResistance(radiusM, waterInAir, temperatureK),
    },
  });
  const hole = { lengthM: layer.thicknessM, radiusM };
  return {
    index,
    densityPerM2,
    holeResistance: {
      oxygen: holeResistance(hole, oxygenInAir, temperatureK),
      water: holeResistance(hole, waterInAir, temperatureK),
    },
    outside: sideOf(collect(-1)),
    inside: sideOf(collect(1)),
  };
}
