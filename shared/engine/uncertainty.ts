import { ZERO_CELSIUS_K } from '../units';
import { InputError } from './description/input-error';
import {
  GEOMETRIC_SD,
  HUMIDITY_SD,
  RELATIVE_SD,
  TEMPERATURE_C,
  TEMPERATURE_SD_K,
} from './description/ranges';
import { readChoice, readList, readNumber, readObject, readOptional } from './description/read-number';
import { normalProbability, normalQuantile } from './normal';
import type { StorageSystem } from './storage-system';
import { readInput, type Input, type InputName, type VariableSystem } from './variable-system';

/** How one input spreads. */
export type UncertainInput = {
  /** Inputs of one group move together, each by its own spread: a resin used in two layers, the weather of all legs. */
  group?: string;
} & (
  | {
      /** As packed, the median; permeabilities mostly. */
      distribution: 'log-normal';
      input: InputName;
      geometric_sd: number;
    }
  | {
      /** As described, the mean; cut off at three standard deviations. Gauges, coatings, areas, masses. */
      distribution: 'truncated normal';
      input: InputName;
      relative_sd: number;
    }
  | {
      /** Of a leg, cut off at three standard deviations and at what is computed with. */
      distribution: 'condition';
      leg: number;
      temperature_sd_K?: number;
      relative_humidity_sd?: number;
    }
  | {
      /** A layer's value and its activation energy as a fit gave them: ln P at the reference temperature, and E. */
      distribution: 'fit';
      input: InputName;
      ln_value_sd: number;
      activation_energy_sd_J_per_mol: number;
      /** Of ln P and E, −1 to 1; 0 if absent. */
      correlation?: number;
    }
);

export interface UncertaintyDescription {
  inputs: UncertainInput[];
}

/** Cut of the truncated normal, in standard deviations, and the probability below it. */
const CUT = 3;
const BELOW_CUT = normalProbability(-CUT);

/** Two independent numbers within 0 to 1 for a group of inputs in one draw. */
export interface Luck {
  first: number;
  second: number;
}

/** One spread, ready to be drawn. */
export interface Spread {
  group: number;
  apply(variable: VariableSystem, luck: Luck): void;
}

const truncatedNormal = (probability: number): number =>
  normalQuantile(BELOW_CUT + probability * (1 - 2 * BELOW_CUT));

const INPUT_COUNT = { min: 0, max: 1000 };

/** The spreads of a study. Errors: InputError for an input that is not there or a spread without sense. */
export function readUncertainty(value: unknown, path: string, system: StorageSystem): Spread[] {
  const given = readObject<UncertaintyDescription>(value, path, 'Uncertainty');
  const list = readList<UncertainInput>(given.inputs, `${path}.inputs`, {
    range: INPUT_COUNT,
    label: 'Uncertain inputs',
  });
  const groups = new Map<string, number>();
  return list.map((item, i) => {
    const at = `${path}.inputs[${i}]`;
    const spread = readObject<UncertainInput>(item, at, 'Uncertain input');
    const name = spread.group === undefined ? `:${i}` : `=${String(spread.group)}`;
    const group = groups.get(name) ?? groups.size;
    groups.set(name, group);
    return { group, apply: readSpread(spread, at, system) };
  });
}

function readSpread(spread: UncertainInput, path: string, system: StorageSystem): Spread['apply'] {
  const distribution = readChoice(spread.distribution, `${path}.distribution`, {
    choices: ['log-normal', 'truncated normal', 'condition', 'fit'] as const,
    label: 'Distribution',
  });
  const given = spread as unknown as Record<string, unknown>;
  if (distribution === 'condition') return readCondition(given, path, system);
  const input = readInput(given.input, `${path}.input`, system);
  if (distribution === 'log-normal') {
    const lnSd = Math.log(
      readNumber(given.geometric_sd, `${path}.geometric_sd`, {
        range: GEOMETRIC_SD,
        label: 'Geometric standard deviation',
      }),
    );
    return (variable, { first }) => void variable.scale(input, Math.exp(lnSd * normalQuantile(first)));
  }
  if (distribution === 'truncated normal') {
    const sd = readNumber(given.relative_sd, `${path}.relative_sd`, {
      range: { ...RELATIVE_SD, max: 0.99 / CUT },
      label: 'Relative standard deviation',
    });
    return (variable, { first }) => void variable.scale(input, 1 + sd * truncatedNormal(first));
  }
  return readFit(given, path, input);
}

function readCondition(given: Record<string, unknown>, path: string, system: StorageSystem): Spread['apply'] {
  const leg = readNumber(given.leg, `${path}.leg`, {
    range: { min: 0, max: system.legs.length - 1 },
    label: 'Number of the leg',
  });
  if (!Number.isInteger(leg)) {
    throw new InputError(`${path}.leg`, leg, 'Number of the leg: whole, counted from 0.');
  }
  const temperatureSd = readOptional(given.temperature_sd_K, `${path}.temperature_sd_K`, {
    range: TEMPERATURE_SD_K,
    label: 'Spread of temperature',
    unit: 'K',
    otherwise: 0,
  });
  const humiditySd = readOptional(given.relative_humidity_sd, `${path}.relative_humidity_sd`, {
    range: HUMIDITY_SD,
    label: 'Spread of humidity',
    otherwise: 0,
  });
  const minK = TEMPERATURE_C.min + ZERO_CELSIUS_K;
  const maxK = TEMPERATURE_C.max + ZERO_CELSIUS_K;
  return ({ system: { legs } }, { first, second }) => {
    const at = legs[leg];
    at.temperatureK = Math.min(
      maxK,
      Math.max(minK, at.temperatureK + temperatureSd * truncatedNormal(first)),
    );
    at.humidity = Math.min(1, Math.max(0, at.humidity + humiditySd * truncatedNormal(second)));
  };
}

/**
 * ln P = ln P_ref − (E/R)(1/T − 1/T_ref) with both coefficients drawn from their joint normal, so that the spread at
 * a leg's temperature is xᵀΣx of the fit, E included.
 */
function readFit(given: Record<string, unknown>, path: string, input: Input): Spread['apply'] {
  if (input.kind !== 'layer_oxygen' && input.kind !== 'layer_water') {
    throw new InputError(`${path}.input`, given.input, 'Fits are of layer_oxygen:W:L or layer_water:W:L.');
  }
  const lnSd = readNumber(given.ln_value_sd, `${path}.ln_value_sd`, {
    range: { min: 0, max: 5 },
    label: 'Standard error of ln P',
  });
  const energySd = readNumber(
    given.activation_energy_sd_J_per_mol,
    `${path}.activation_energy_sd_J_per_mol`,
    { range: { min: 0, max: 1e5 }, label: 'Standard error of the activation energy', unit: 'J/mol' },
  );
  const correlation = readOptional(given.correlation, `${path}.correlation`, {
    range: { min: -1, max: 1 },
    label: 'Correlation',
    otherwise: 0,
  });
  const rest = Math.sqrt(1 - correlation * correlation);
  return (variable, { first, second }) => {
    const one = normalQuantile(first);
    variable.scale(input, Math.exp(lnSd * one));
    const layer = variable.layerOf(input);
    const gas = input.kind === 'layer_oxygen' ? layer.oxygen : layer.water;
    if (gas) {
      gas.activationEnergyJPerMol += energySd * (correlation * one + rest * normalQuantile(second));
    }
  };
}
