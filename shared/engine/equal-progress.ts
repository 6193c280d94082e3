import { arrheniusFactor } from './arrhenius';
import { ACTIVATION_ENERGY_J_PER_MOL, TARGET_DAYS, THICKNESS_UM } from './description/ranges';
import { readTemperatureK } from './description/read-conditions';
import { readNumber, readObject } from './description/read-number';

export interface EqualProgressDescription {
  time_1_days: number;
  temperature_1_C: number;
  thickness_1_um: number;
  temperature_2_C: number;
  thickness_2_um: number;
  diffusivity_activation_energy_J_per_mol: number;
}

/**
 * The time [days] after which diffusion has come as far at another temperature and gauge: D·t/x² is the same for the
 * same geometry and the same concentrations at the faces, so t₂ = t₁ · (x₂/x₁)² · D(T₁)/D(T₂), with Arrhenius' law.
 * Range: −30 to 60 °C. Errors: InputError. Cost: one exponential.
 */
export function equalProgress(description: EqualProgressDescription): { time_2_days: number } {
  const given = readObject<EqualProgressDescription>(description, '', 'Description');
  const time = readNumber(given.time_1_days, 'time_1_days', {
    range: TARGET_DAYS,
    label: 'Time',
    unit: 'days',
  });
  const thickness = (key: 'thickness_1_um' | 'thickness_2_um'): number =>
    readNumber(given[key], key, { range: THICKNESS_UM, label: 'Thickness', unit: 'µm' });
  const energy = readNumber(
    given.diffusivity_activation_energy_J_per_mol,
    'diffusivity_activation_energy_J_per_mol',
    { range: ACTIVATION_ENERGY_J_PER_MOL, label: 'Activation energy of diffusion', unit: 'J/mol' },
  );
  const first = readTemperatureK(given.temperature_1_C, 'temperature_1_C');
  const second = readTemperatureK(given.temperature_2_C, 'temperature_2_C');
  const stretch = thickness('thickness_2_um') / thickness('thickness_1_um');
  return { time_2_days: time * stretch * stretch * arrheniusFactor(energy, first, second) };
}
