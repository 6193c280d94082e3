import type {
  CoatingDescription,
  EvaluationDescription,
  FilmDescription,
  FoilDescription,
  LayerDescription,
  StorageDescription,
} from '../../shared/engine';

/** Layers and packs the engine's tests are built from; all values invented. */
export const polyester: FilmDescription = {
  kind: 'film',
  name: 'polyester',
  thickness_um: 12,
  oxygen: { permeability_mol_m_per_m2_s_Pa: 6.6e-18, activation_energy_J_per_mol: 31_000 },
  water: { permeability_mol_m_per_m2_s_Pa: 5.2e-14, activation_energy_J_per_mol: 4_000 },
};

export const polyethylene: FilmDescription = {
  kind: 'film',
  name: 'polyethylene',
  thickness_um: 50,
  oxygen: { permeability_mol_m_per_m2_s_Pa: 9.2e-16, activation_energy_J_per_mol: 41_000 },
  water: { permeability_mol_m_per_m2_s_Pa: 4e-14, activation_energy_J_per_mol: 35_000 },
};

export const vinylAlcohol: FilmDescription = {
  kind: 'film',
  name: 'ethylene vinyl alcohol',
  thickness_um: 6,
  oxygen: {
    permeability_mol_m_per_m2_s_Pa: 5e-20,
    activation_energy_J_per_mol: 52_000,
    humidity_curve: { relative_humidity: [0, 0.3, 0.6, 0.75, 0.9, 1], factor: [1, 0.8, 1.6, 4, 30, 110] },
  },
  water: {
    permeability_mol_m_per_m2_s_Pa: 1.2e-13,
    activation_energy_J_per_mol: 25_000,
    humidity_curve: { relative_humidity: [0, 0.5, 0.8, 1], factor: [1, 1.9, 5, 20] },
  },
};

export const foil: FoilDescription = { kind: 'foil', name: 'foil', thickness_um: 9 };

export function coatingOf(permeance: number): CoatingDescription {
  const gas = { permeance_mol_per_m2_s_Pa: permeance };
  return { kind: 'coating', name: 'coating', oxygen: { ...gas }, water: { ...gas } };
}

interface Choices {
  layers?: LayerDescription[];
  pack?: Partial<StorageDescription['pack']>;
  food?: Partial<StorageDescription['food']>;
}

/** A pouch of 0.06 m² with 250 cm³ of headspace on one leg at 23 °C, 50 %. */
export function description(
  choices: Choices & Partial<Omit<EvaluationDescription, 'pack' | 'food'>> = {},
): EvaluationDescription {
  const { layers = [polyester, polyethylene], pack, food, ...rest } = choices;
  return {
    pack: {
      walls: [{ name: 'pouch', area_m2: 0.06, layers }],
      headspace_cm3: 250,
      starting_headspace_oxygen_percent: 1.5,
      ...pack,
    },
    food: { mass_kg: 0.2, oxygen_mode: 'at_once', inside_relative_humidity: 0.3, ...food },
    route: { legs: [{ temperature_C: 23, relative_humidity: 0.5, days: 10 }], after_last: 'hold' },
    limits: { oxygen_uptake_mg_per_kg: 60 },
    horizon_days: 3650,
    ...rest,
  };
}
