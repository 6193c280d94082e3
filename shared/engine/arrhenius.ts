import { GAS_CONSTANT } from '../units';

/**
 * Arrhenius factor [-] between two temperatures [K]: exp[−(E/R)(1/T − 1/T_ref)].
 * Range: both temperatures above 0 K; E [J/mol] may be negative. Cost: one exponential.
 */
export function arrheniusFactor(energyJPerMol: number, temperatureK: number, referenceK: number): number {
  if (energyJPerMol === 0 || temperatureK === referenceK) return 1;
  return Math.exp((-energyJPerMol / GAS_CONSTANT) * (1 / temperatureK - 1 / referenceK));
}

/**
 * Value of prefactor · exp(−E/(R·T)), in the prefactor's unit. Range: T above 0 K. Cost: one exponential.
 */
export function arrheniusValue(prefactor: number, energyJPerMol: number, temperatureK: number): number {
  return prefactor * Math.exp(-energyJPerMol / (GAS_CONSTANT * temperatureK));
}
