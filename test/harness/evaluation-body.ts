import type { EvaluationDescription } from '../../shared/engine';

/** A description as somebody would send it: two walls, three layers, a route of two legs. Fresh at each call. */
export function evaluationBody(): EvaluationDescription {
  const polymer = { permeability_mol_m_per_m2_s_Pa: 9e-16, activation_energy_J_per_mol: 36_500 };
  const water = { permeability_mol_m_per_m2_s_Pa: 4e-15, activation_energy_J_per_mol: 26_000 };
  return {
    pack: {
      walls: [
        {
          name: 'body',
          area_m2: 0.06,
          layers: [
            {
              kind: 'film',
              name: 'PET',
              thickness_um: 12,
              oxygen: { permeability_mol_m_per_m2_s_Pa: 8e-18 },
              water,
            },
            {
              kind: 'film',
              name: 'EVOH',
              thickness_um: 5,
              oxygen: {
                permeability_mol_m_per_m2_s_Pa: 5e-20,
                humidity_curve: { relative_humidity: [0.6, 0.8, 0.9], factor: [1, 9, 100] },
                reference_relative_humidity: 0.6,
              },
              water,
            },
            { kind: 'film', name: 'PE', thickness_um: 50, oxygen: polymer, water },
          ],
        },
        {
          name: 'lid',
          area_m2: 0.01,
          layers: [
            {
              kind: 'foil',
              name: 'foil',
              thickness_um: 7,
              defects: { density_per_m2: 300, diameter_um: 25 },
            },
            { kind: 'film', name: 'PE', thickness_um: 50, oxygen: polymer, water },
          ],
        },
      ],
      headspace_cm3: 120,
      starting_headspace_oxygen_percent: 0.5,
      seal: { sealant_thickness_um: 100, length_mm: 700, width_mm: 8, oxygen: polymer, water },
    },
    food: {
      mass_kg: 0.2,
      oxygen_mode: 'at_once',
      isotherm: { type: 'GAB', Xm_g_per_g: 0.0275, C: 10, K: 0.918 },
      initial_moisture_g_per_g: 0.02,
    },
    route: {
      legs: [
        { name: 'Sea', temperature_C: 31, relative_humidity: 0.75, days: 30 },
        { name: 'Shop', temperature_C: 26, relative_humidity: 0.65, days: 60 },
      ],
      after_last: 'hold',
    },
    limits: { oxygen_uptake_mg_per_kg: 40, moisture_max_g_per_g: 0.0371 },
    horizon_days: 730,
    target_days: 180,
  };
}
