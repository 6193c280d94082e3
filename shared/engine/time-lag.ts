import { GAS_CONSTANT, ZERO_CELSIUS_K } from '../units';
import { InputError } from './description/input-error';
import {
  ACTIVATION_ENERGY_J_PER_MOL,
  DIFFUSIVITY_M2_PER_S,
  DIFFUSIVITY_PREFACTOR_M2_PER_S,
  LAYER_COUNT,
  PERMEABILITY_SI,
  PERMEANCE_SI,
  THICKNESS_UM,
} from './description/ranges';
import { readTemperatureK } from './description/read-conditions';
import { readList, readNumber, readObject } from './description/read-number';

/** A film with what it holds of the gas, or a coating: resistance without capacity. */
export type TimeLagLayer =
  | {
      thickness_um: number;
      /** At the temperature in question. */
      permeability_mol_m_per_m2_s_Pa: number;
      /** Either the value itself, or the two constants of D = D0·exp(−Q/(R·T)). */
      diffusivity_m2_per_s?: number;
      diffusivity_prefactor_m2_per_s?: number;
      diffusivity_activation_energy_J_per_mol?: number;
    }
  | { permeance_mol_per_m2_s_Pa: number };

export interface TimeLagDescription {
  /** Outside face first; either way round gives the same lag. */
  layers: TimeLagLayer[];
  /** Needed where a layer states D by its two constants. */
  temperature_C?: number;
}

export interface TimeLagAnswer {
  time_lag_s: number;
  /** What each layer adds; 0 for a coating. */
  layer_part_s: number[];
}

interface LagLayer {
  /** ℓ/P or 1/Q, m²·s·Pa/mol. */
  resistance: number;
  /** S·ℓ, mol/(m²·Pa): what the layer holds. */
  capacity: number;
}

/**
 * Time lag [s] of layers in series, the time by which a steady line through the amount passed is late:
 * L = R_T Σ S_i ∫ φ(1 − φ) dx, φ the share of the resistance from a point to the inside face, S = P/D.
 * For one layer ℓ²/(6D) (Daynes 1920, Barrer 1939); for two the form of Ash, Barrer & Palmer (1965), here for any
 * number. φ(1 − φ) is a parabola within a layer, so Simpson's rule is exact and keeps every digit.
 * Range: description/ranges.ts. Errors: InputError. Cost: some microseconds.
 */
export function timeLag(description: TimeLagDescription): TimeLagAnswer {
  const given = readObject<TimeLagDescription>(description, '', 'Description');
  const layers = readList<TimeLagLayer>(given.layers, 'layers', {
    range: LAYER_COUNT,
    label: 'Layers of a wall',
  });
  const parts = lagParts(layers.map((layer, i) => readLagLayer(layer, `layers[${i}]`, given.temperature_C)));
  return { time_lag_s: parts.reduce((sum, part) => sum + part, 0), layer_part_s: parts };
}

function lagParts(layers: LagLayer[]): number[] {
  const total = layers.reduce((sum, layer) => sum + layer.resistance, 0);
  // φ at the faces, summed from the inside, and 1 − φ, summed from the outside: neither is a small difference.
  const inner = new Array<number>(layers.length + 1).fill(0);
  const outer = new Array<number>(layers.length + 1).fill(0);
  for (let i = layers.length - 1; i >= 0; i--) inner[i] = inner[i + 1] + layers[i].resistance / total;
  layers.forEach((layer, i) => {
    outer[i + 1] = outer[i] + layer.resistance / total;
  });
  return layers.map(({ capacity }, i) => {
    const middle = ((inner[i] + inner[i + 1]) / 2) * ((outer[i] + outer[i + 1]) / 2);
    const mean = (inner[i] * outer[i] + 4 * middle + inner[i + 1] * outer[i + 1]) / 6;
    return total * capacity * mean;
  });
}

function readLagLayer(value: unknown, path: string, temperatureC: number | undefined): LagLayer {
  const layer = readObject<Record<string, unknown>>(value, path, 'Layer');
  if (layer.permeance_mol_per_m2_s_Pa !== undefined) {
    const permeance = readNumber(layer.permeance_mol_per_m2_s_Pa, `${path}.permeance_mol_per_m2_s_Pa`, {
      range: PERMEANCE_SI,
      label: 'Permeance',
      unit: 'mol/(m²·s·Pa)',
    });
    return { resistance: 1 / permeance, capacity: 0 };
  }
  const thicknessM =
    readNumber(layer.thickness_um, `${path}.thickness_um`, {
      range: THICKNESS_UM,
      label: 'Thickness',
      unit: 'µm',
    }) * 1e-6;
  const permeability = readNumber(
    layer.permeability_mol_m_per_m2_s_Pa,
    `${path}.permeability_mol_m_per_m2_s_Pa`,
    { range: PERMEABILITY_SI, label: 'Permeability', unit: 'mol·m/(m²·s·Pa)' },
  );
  const diffusivity = readDiffusivity(layer, path, temperatureC);
  return { resistance: thicknessM / permeability, capacity: (permeability / diffusivity) * thicknessM };
}

/** D [m²/s], as stated or from its two constants at the temperature. */
function readDiffusivity(
  layer: Record<string, unknown>,
  path: string,
  temperatureC: number | undefined,
): number {
  if (layer.diffusivity_m2_per_s !== undefined) {
    return readNumber(layer.diffusivity_m2_per_s, `${path}.diffusivity_m2_per_s`, {
      range: DIFFUSIVITY_M2_PER_S,
      label: 'Diffusivity',
      unit: 'm²/s',
    });
  }
  const prefactor = readNumber(
    layer.diffusivity_prefactor_m2_per_s,
    `${path}.diffusivity_prefactor_m2_per_s`,
    { range: DIFFUSIVITY_PREFACTOR_M2_PER_S, label: 'Diffusivity', unit: 'm²/s' },
  );
  const energy = readNumber(
    layer.diffusivity_activation_energy_J_per_mol,
    `${path}.diffusivity_activation_energy_J_per_mol`,
    { range: ACTIVATION_ENERGY_J_PER_MOL, label: 'Activation energy of diffusion', unit: 'J/mol' },
  );
  const temperatureK = readTemperatureK(temperatureC, 'temperature_C');
  const diffusivity = prefactor * Math.exp(-energy / (GAS_CONSTANT * temperatureK));
  const { min, max } = DIFFUSIVITY_M2_PER_S;
  if (!(diffusivity >= min && diffusivity <= max)) {
    throw new InputError(
      `${path}.diffusivity_prefactor_m2_per_s`,
      prefactor,
      `These constants make ${diffusivity.toPrecision(3)} m²/s at ${(temperatureK - ZERO_CELSIUS_K).toFixed(1)} °C; ` +
        `use ${min} to ${max} m²/s.`,
    );
  }
  return diffusivity;
}
