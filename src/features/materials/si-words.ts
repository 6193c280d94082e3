import {
  formatNumber,
  formatQuantity,
  type DisplayUnitSystem,
  type ShownQuantity,
} from '../../../shared/units/format';
import type { GasBlock } from './gas-form-values';
import type { Gas } from './unit-choice';

/** The coefficient in SI and in the reader's unit: 'In SI: 8.15×10⁻¹⁸ mol·m/(m²·s·Pa), which is 1600 cm³·µm/(m²·day·atm)'. */
export function siInWords(gas: Gas, block: GasBlock, unitSystem: DisplayUnitSystem): string {
  const shown = coefficientInWords(gas, block, unitSystem);
  const si =
    'permeability_mol_m_per_m2_s_Pa' in block
      ? `${formatNumber(block.permeability_mol_m_per_m2_s_Pa, 4)} mol·m/(m²·s·Pa)`
      : `${formatNumber(block.permeance_mol_per_m2_s_Pa, 4)} mol/(m²·s·Pa)`;
  return `In SI: ${si}, which is ${shown}.`;
}

export function coefficientInWords(gas: Gas, block: GasBlock, unitSystem: DisplayUnitSystem): string {
  return shownCoefficient(gas, block, unitSystem).text;
}

export function shownCoefficient(gas: Gas, block: GasBlock, unitSystem: DisplayUnitSystem): ShownQuantity {
  if ('permeability_mol_m_per_m2_s_Pa' in block) {
    const kind =
      gas === 'oxygen' ? 'oxygen_permeability_mol_m_per_m2_s_Pa' : 'water_permeability_mol_m_per_m2_s_Pa';
    return formatQuantity(block.permeability_mol_m_per_m2_s_Pa, kind, { unitSystem });
  }
  const kind = gas === 'oxygen' ? 'oxygen_permeance_mol_per_m2_s_Pa' : 'water_permeance_mol_per_m2_s_Pa';
  return formatQuantity(block.permeance_mol_per_m2_s_Pa, kind, { unitSystem });
}
