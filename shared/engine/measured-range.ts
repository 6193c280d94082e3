import type { GasInLayer } from './layer';

/** How far, in K, Arrhenius' law is trusted beyond the temperatures of its measurement. */
export const TRUSTED_BEYOND_K = 15;

/** Guards a comparison of two temperatures against their last bit. */
const ROUNDING_K = 1e-9;

/** True more than 15 K outside a known measured range; false where none is known. */
export function isBeyondMeasured(gas: GasInLayer, temperatureK: number): boolean {
  const isBelow =
    gas.measuredMinK !== null && temperatureK < gas.measuredMinK - TRUSTED_BEYOND_K - ROUNDING_K;
  const isAbove =
    gas.measuredMaxK !== null && temperatureK > gas.measuredMaxK + TRUSTED_BEYOND_K + ROUNDING_K;
  return isBelow || isAbove;
}

/** True more than 15 K from the reference, on a side whose measured end is not known. */
export function isFarFromReference(gas: GasInLayer, temperatureK: number): boolean {
  const beyondK = temperatureK - gas.referenceK;
  const isEndUnknown = beyondK < 0 ? gas.measuredMinK === null : gas.measuredMaxK === null;
  return isEndUnknown && Math.abs(beyondK) > TRUSTED_BEYOND_K + ROUNDING_K;
}
