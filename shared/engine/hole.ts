import { GAS_CONSTANT } from '../units';

/** Diffusion coefficients in air at 20 °C and 1 atm, m²/s (memory; handbook values). */
export const OXYGEN_IN_AIR_20C = 2.0e-5;
export const WATER_IN_AIR_20C = 2.42e-5;

/** End correction of a hole over a film: 3π/8, rounded as published. */
const SPREADING = 1.18;

/**
 * Diffusion coefficient in air [m²/s] at a temperature [K]: D(20 °C)·(T/293.15)^1.75, whatever the total pressure.
 */
export function diffusivityInAir(at20C: number, temperatureK: number): number {
  return at20C * (temperatureK / 293.15) ** 1.75;
}

/** Resistance of a hole's own length of air [s·Pa/mol]: ℓRT/(D π r²). */
export function holeResistance(
  hole: { lengthM: number; radiusM: number },
  diffusivity: number,
  temperatureK: number,
): number {
  const { lengthM, radiusM } = hole;
  return (lengthM * GAS_CONSTANT * temperatureK) / (diffusivity * Math.PI * radiusM * radiusM);
}

/** Resistance of a side without a film [s·Pa/mol]: RT/(4 D r). */
export function bareSideResistance(radiusM: number, diffusivity: number, temperatureK: number): number {
  return (GAS_CONSTANT * temperatureK) / (4 * diffusivity * radiusM);
}

/**
 * Resistance of a side covered by polymer [s·Pa/mol]: Σ(ℓ/P + 1/Q) / [π r² (1 + 1.18 L/r)].
 * Within ±7.6 % of the exact solution for one hole, L/r 0.02 to 1000; an estimate.
 * Source: Prins & Hermans, J. Phys. Chem. 63 (1959) 716.
 */
export function coveredSideResistance(
  coverResistance: number,
  coverThicknessM: number,
  radiusM: number,
): number {
  return coverResistance / (Math.PI * radiusM * radiusM * (1 + (SPREADING * coverThicknessM) / radiusM));
}

/**
 * Conductance of leak channels [mol/(s·Pa)]: N·(D/(RT))·(π d²/4)/(L + π d/4); each mouth adds π d/8 of length.
 */
export function channelConductance(
  channel: { count: number; lengthM: number; diameterM: number },
  diffusivity: number,
  temperatureK: number,
): number {
  const { count, lengthM, diameterM } = channel;
  if (count === 0) return 0;
  const section = (Math.PI * diameterM * diameterM) / 4;
  return (
    ((count * diffusivity) / (GAS_CONSTANT * temperatureK)) *
    (section / (lengthM + (Math.PI * diameterM) / 4))
  );
}
