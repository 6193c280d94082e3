import { describe, expect, it } from 'vitest';
import { evaluate } from '../../../shared/engine';
import type { EvaluationDescription } from '../../../shared/engine/description/evaluation';
import { compareOnLeg, evaluateTurned, turnedRoundReason } from './turned-round';

const percent = (fraction: number) => `${Math.round(fraction * 100)} %`;

function descriptionWith(evohCurve: boolean): EvaluationDescription {
  return {
    pack: {
      walls: [
        {
          name: 'wall',
          area_m2: 0.05,
          layers: [
            film('PET', 12, { oxygen: 8e-18, water: 5e-14 }),
            {
              kind: 'film',
              name: 'EVOH',
              thickness_um: 5,
              oxygen: {
                permeability_mol_m_per_m2_s_Pa: 5e-20,
                ...(evohCurve
                  ? { humidity_curve: { relative_humidity: [0, 0.6, 0.9], factor: [1, 2, 40] } }
                  : {}),
              },
              water: { permeability_mol_m_per_m2_s_Pa: 2e-13 },
            },
            film('LDPE', 60, { oxygen: 9e-16, water: 4e-14 }),
          ],
        },
      ],
    },
    food: { mass_kg: 0.2, oxygen_mode: 'at_once', inside_relative_humidity: 0.2 },
    route: { legs: [{ temperature_C: 30, relative_humidity: 0.85, days: 10 }], after_last: 'hold' },
    limits: { oxygen_uptake_mg_per_kg: 60 },
    horizon_days: 3650,
  };
}

function film(name: string, thickness_um: number, permeability: { oxygen: number; water: number }) {
  return {
    kind: 'film' as const,
    name,
    thickness_um,
    oxygen: { permeability_mol_m_per_m2_s_Pa: permeability.oxygen },
    water: { permeability_mol_m_per_m2_s_Pa: permeability.water },
  };
}

function comparisonOf(description: EvaluationDescription) {
  const comparison = compareOnLeg({
    layers: description.pack.walls[0]?.layers ?? [],
    asLaid: evaluate(description),
    turned: evaluateTurned(description),
    wall: 0,
    leg: 0,
  });
  if (comparison === null) throw new Error('no leg to compare');
  return comparison;
}

describe('turned round', () => {
  it('with the sealant outside the EVOH is drier and holds more oxygen back; the reason says so', () => {
    const comparison = comparisonOf(descriptionWith(true));
    expect(comparison.oxygenPermeanceTurned).toBeLessThan(comparison.oxygenPermeanceAsLaid * 0.9);
    const [layer] = comparison.sensitive;
    expect(layer?.humidityTurned).toBeLessThan(layer?.humidityAsLaid ?? 0);
    expect(turnedRoundReason(comparison, percent)).toMatch(
      /^EVOH sits at \d+ % humidity as laid and at \d+ % turned round, .* lets less oxygen through\.$/,
    );
  });

  it('says that nothing changes where no layer feels humidity', () => {
    const comparison = comparisonOf(descriptionWith(false));
    expect(comparison.oxygenPermeanceTurned).toBeCloseTo(comparison.oxygenPermeanceAsLaid, 30);
    expect(turnedRoundReason(comparison, percent)).toMatch(/passes the same oxygen both ways round/);
  });
});
