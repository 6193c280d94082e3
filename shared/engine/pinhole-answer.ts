import { readTemperatureK } from './description/read-conditions';
import {
  COATING_THICKNESS_UM,
  DEFECT_DENSITY_PER_M2,
  HOLE_DIAMETER_UM,
  PERMEABILITY_SI,
  THICKNESS_UM,
} from './description/ranges';
import { readChoice, readNumber, readObject, readOptional } from './description/read-number';
import {
  bareSideResistance,
  coveredSideResistance,
  diffusivityInAir,
  holeResistance,
  OXYGEN_IN_AIR_20C,
  WATER_IN_AIR_20C,
} from './hole';

export interface CoverDescription {
  thickness_um: number;
  permeability_mol_m_per_m2_s_Pa: number;
}

export interface PinholeDescription {
  gas: 'oxygen' | 'water';
  temperature_C: number;
  hole_diameter_um: number;
  /** 0 if absent. */
  metal_thickness_um?: number;
  density_per_m2: number;
  /** null or absent: bare. */
  outside_cover?: CoverDescription | null;
  inside_cover?: CoverDescription | null;
}

export interface PinholeAnswer {
  outside_resistance_s_Pa_per_mol: number;
  hole_resistance_s_Pa_per_mol: number;
  inside_resistance_s_Pa_per_mol: number;
  /** One hole. */
  conductance_mol_per_s_Pa: number;
  layer_permeance_mol_per_m2_s_Pa: number;
}

/**
 * Conductance of one hole [mol/(s·Pa)] and permeance of a layer full of them [mol/(m²·s·Pa)]:
 * 1/(R_out + R_hole + R_in); equations at hole.ts. An estimate: within ±7.6 % for one hole, up to −19 % in series with
 * its neighbours at 1 to 11 % open area. Errors: InputError. Source: Prins & Hermans 1959.
 */
export function pinhole(description: PinholeDescription): PinholeAnswer {
  const gas = readChoice(description.gas, 'gas', { choices: ['oxygen', 'water'] as const, label: 'Gas' });
  const temperatureK = readTemperatureK(description.temperature_C, 'temperature_C');
  const radiusM =
    0.5e-6 *
    readNumber(description.hole_diameter_um, 'hole_diameter_um', {
      range: HOLE_DIAMETER_UM,
      label: 'Diameter',
      unit: 'µm',
    });
  const metalM =
    1e-6 *
    readOptional(description.metal_thickness_um, 'metal_thickness_um', {
      range: COATING_THICKNESS_UM,
      label: 'Metal thickness',
      unit: 'µm',
      otherwise: 0,
    });
  const density = readNumber(description.density_per_m2, 'density_per_m2', {
    range: DEFECT_DENSITY_PER_M2,
    label: 'Pinholes',
    unit: 'per m²',
  });
  const diffusivity = diffusivityInAir(gas === 'oxygen' ? OXYGEN_IN_AIR_20C : WATER_IN_AIR_20C, temperatureK);
  const side = (value: unknown, path: string): number => {
    if (value === undefined || value === null) return bareSideResistance(radiusM, diffusivity, temperatureK);
    const cover = readObject<CoverDescription>(value, path, 'Cover');
    const thicknessM =
      1e-6 *
      readNumber(cover.thickness_um, `${path}.thickness_um`, {
        range: THICKNESS_UM,
        label: 'Thickness',
        unit: 'µm',
      });
    const permeability = readNumber(
      cover.permeability_mol_m_per_m2_s_Pa,
      `${path}.permeability_mol_m_per_m2_s_Pa`,
      { range: PERMEABILITY_SI, label: 'Permeability', unit: 'mol·m/(m²·s·Pa)' },
    );
    return coveredSideResistance(thicknessM / permeability, thicknessM, radiusM);
  };
  const outside = side(description.outside_cover, 'outside_cover');
  const inside = side(description.inside_cover, 'inside_cover');
  const hole = holeResistance({ lengthM: metalM, radiusM }, diffusivity, temperatureK);
  const conductance = 1 / (outside + hole + inside);
  return {
    outside_resistance_s_Pa_per_mol: outside,
    hole_resistance_s_Pa_per_mol: hole,
    inside_resistance_s_Pa_per_mol: inside,
    conductance_mol_per_s_Pa: conductance,
    layer_permeance_mol_per_m2_s_Pa: density * conductance,
  };
}
