import { arrheniusFactor } from './arrhenius';
import { HumidityCurve } from './humidity-curve';

/** One gas in one layer: its permeance at the reference temperature and humidity, and what moves it from there. */
export interface GasInLayer {
  /** mol/(m²·s·Pa): permeability over thickness for a film, the stated permeance for a coating. */
  permeanceSi: number;
  referenceK: number;
  activationEnergyJPerMol: number;
  /** 1 at the reference humidity; null: humidity has no effect. */
  curve: HumidityCurve | null;
  /** Temperatures between which the activation energy was measured. */
  measuredMinK: number | null;
  measuredMaxK: number | null;
}

export interface Defects {
  densityPerM2: number;
  radiusM: number;
}

export interface Layer {
  kind: 'film' | 'coating' | 'foil';
  name: string;
  thicknessM: number;
  /** null for foil: nothing passes the metal. */
  oxygen: GasInLayer | null;
  water: GasInLayer | null;
  /** f_w/f_o where oxygen feels humidity, else null; made once by `layerOf`. */
  waterOverOxygen: HumidityCurve | null;
  defects: Defects | null;
}

/** A layer with what follows from its two gases. */
export function layerOf(layer: Omit<Layer, 'waterOverOxygen'>): Layer {
  const oxygenCurve = layer.oxygen?.curve ?? null;
  const waterOverOxygen = oxygenCurve
    ? HumidityCurve.quotient(layer.water?.curve ?? null, oxygenCurve)
    : null;
  return { ...layer, waterOverOxygen };
}

/** Permeance [mol/(m²·s·Pa)] at a temperature and at the humidity for which the reference value holds. */
export function permeanceAtTemperature(gas: GasInLayer, temperatureK: number): number {
  return gas.permeanceSi * arrheniusFactor(gas.activationEnergyJPerMol, temperatureK, gas.referenceK);
}

/** Permeance [mol/(m²·s·Pa)] at a temperature and a humidity: P_ref · Arrhenius · f(h)/f(h_ref). */
export function permeanceAt(gas: GasInLayer, temperatureK: number, humidity: number): number {
  return permeanceAtTemperature(gas, temperatureK) * (gas.curve ? gas.curve.at(humidity) : 1);
}
