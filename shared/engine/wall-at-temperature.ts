import {
  bareSideResistance,
  coveredSideResistance,
  diffusivityInAir,
  holeResistance,
  OXYGEN_IN_AIR_20C,
  WATER_IN_AIR_20C,
} from './hole';
import type { HumidityCurve, WalkEnds } from './humidity-curve';
import { permeanceAtTemperature, type Layer } from './layer';

/** A layer whose holes are open, with the layers that cover them on either side. */
interface PiercedLayer {
  index: number;
  densityPerM2: number;
  radiusM: number;
  holeOxygen: number;
  holeWater: number;
  bareOxygen: number;
  bareWater: number;
  outsideCover: number[];
  insideCover: number[];
  outsideThicknessM: number;
  insideThicknessM: number;
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
  private readonly ends: WalkEnds = { startFactor: 1, endFactor: 1 };
  private riseSlope = 0;
  private lastPermeance = 0;

  constructor(layers: readonly Layer[], temperatureK: number) {
    const count = layers.length;
    this.count = count;
    this.temperatureK = temperatureK;
    this.rise = new Float64Array(count);
    this.driestHumidity = new Float64Array(count);
    this.waterResistance = new Float64Array(count);
    this.oxygenResistance = new Float64Array(count);
    this.ownWater = new Float64Array(count);
    this.ownOxygen = new Float64Array(count);
    this.holesWater = new Float64Array(count);
    this.holesOxygen = new Float64Array(count);
    this.waterCurves = layers.map((layer) => layer.water?.curve ?? null);
    this.oxygenCurves = layers.map((layer) => layer.oxygen?.curve ?? null);
    this.quotients = layers.map((layer) => layer.waterOverOxygen);
    layers.forEach((layer, i) => {
      if (layer.water) this.ownWater[i] = permeanceAtTemperature(layer.water, temperatureK);
      if (layer.oxygen) this.ownOxygen[i] = permeanceAtTemperature(layer.oxygen, temperatureK);
    });
    this.isTight = layers.some((layer) => layer.kind === 'foil' && !layer.defects);
    this.hasWaterCurve = this.waterCurves.some((curve) => curve !== null);
    this.pierced = layers.flatMap((layer, i) => (layer.defects ? [pierce(layers, i, temperatureK)] : []));
    const coverOf = (curves: (HumidityCurve | null)[]): boolean =>
      this.pierced.some((hole) =>
        [...hole.outsideCover, ...hole.insideCover].some((i) => curves[i] !== null),
      );
    const isWaterCovered = coverOf(this.waterCurves);
    const isOxygenCovered = coverOf(this.oxygenCurves);
    this.doCoversFeelHumidity = isWaterCovered || isOxygenCovered;
    this.isWaterHumid = !this.isTight && (this.hasWaterCurve || isWaterCovered);
    this.isOxygenHumid =
      !this.isTight && (isOxygenCovered || this.oxygenCurves.some((curve) => curve !== null));
    this.updateHoles(0, 0);
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
    let low = 0;
    let high = 0;
    for (let i = 0; i < this.count; i++) {
      const curve = this.waterCurves[i];
      low += 1 / (this.ownWater[i] * (curve ? curve.minFactor : 1) + this.holesWater[i]);
      high += 1 / (this.ownWater[i] * (curve ? curve.maxFactor : 1) + this.holesWater[i]);
    }
    let lowFlux = (span / low) * (1 - 1e-12);
    let highFlux = (span / high) * (1 + 1e-12);
    let flux = this.lastPermeance * span;
    if (!(flux > lowFlux && flux < highFlux)) flux = Math.sqrt(lowFlux) * Math.sqrt(highFlux);
    for (let iteration = 0; iteration < 200; iteration++) {
      const total = this.walk(flux, driest, isDryInside);
      const ratio = total / span;
      if (ratio > 1) highFlux = flux;
      else lowFlux = flux;
      if (Math.abs(ratio - 1) < 2e-15 || !this.hasWaterCurve) break;
      const next = flux * Math.exp((-Math.log(ratio) * total) / (flux * this.riseSlope));
      if (Math.abs(next - flux) <= 1e-15 * flux) break;
      flux = next > lowFlux && next < highFlux ? next : Math.sqrt(lowFlux) * Math.sqrt(highFlux);
      if (highFlux - lowFlux <= 2e-16 * highFlux) break;
    }
    if (!this.hasWaterCurve) flux = span / low;
    for (let i = 0; i < this.count; i++) this.waterResistance[i] = this.rise[i] / flux;
    this.lastPermeance = flux / span;
    return flux;
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
        rise = curve.riseFor(own, holes, from, flux, this.ends);
        slope = (slope * (own * this.ends.startFactor + holes) + 1) / (own * this.ends.endFactor + holes);
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
      const area = hole.densityPerM2;
      this.holesWater[hole.index] =
        area /
        (this.sideResistance(hole.outsideCover, hole.outsideThicknessM, hole, outside, true) +
          hole.holeWater +
          this.sideResistance(hole.insideCover, hole.insideThicknessM, hole, inside, true));
      this.holesOxygen[hole.index] =
        area /
        (this.sideResistance(hole.outsideCover, hole.outsideThicknessM, hole, outside, false) +
          hole.holeOxygen +
          this.sideResistance(hole.insideCover, hole.insideThicknessM, hole, inside, false));
    }
  }

  private sideResistance(
    cover: number[],
    thicknessM: number,
    hole: PiercedLayer,
    humidity: number,
    isWater: boolean,
  ): number {
    if (cover.length === 0) return isWater ? hole.bareWater : hole.bareOxygen;
    const own = isWater ? this.ownWater : this.ownOxygen;
    const curves = isWater ? this.waterCurves : this.oxygenCurves;
    let sum = 0;
    for (let k = 0; k < cover.length; k++) {
      const curve = curves[cover[k]];
      sum += 1 / (own[cover[k]] * (curve ? curve.at(humidity) : 1));
    }
    return coveredSideResistance(sum, thicknessM, hole.radiusM);
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
  const outsideCover = collect(-1);
  const insideCover = collect(1);
  const thickness = (cover: number[]): number => cover.reduce((sum, i) => sum + layers[i].thicknessM, 0);
  const oxygenInAir = diffusivityInAir(OXYGEN_IN_AIR_20C, temperatureK);
  const waterInAir = diffusivityInAir(WATER_IN_AIR_20C, temperatureK);
  return {
    index,
    densityPerM2: defects.densityPerM2,
    radiusM: defects.radiusM,
    holeOxygen: holeResistance(layer.thicknessM, defects.radiusM, oxygenInAir, temperatureK),
    holeWater: holeResistance(layer.thicknessM, defects.radiusM, waterInAir, temperatureK),
    bareOxygen: bareSideResistance(defects.radiusM, oxygenInAir, temperatureK),
    bareWater: bareSideResistance(defects.radiusM, waterInAir, temperatureK),
    outsideCover,
    insideCover,
    outsideThicknessM: thickness(outsideCover),
    insideThicknessM: thickness(insideCover),
  };
}
