import { describe, expect, it } from 'vitest';
import type { LayerDescription } from '../../../shared/engine/description/storage-description';
import { figuresIn } from './use-figures';
import { readCondition, wallAtCondition } from './wall-condition';

/** 1 cm³(STP)·µm/(m²·day·atm) in mol·m/(m²·s·Pa). */
const CUSTOMARY = 5.09625e-21;
const film = (name: string, thickness_um: number, permeability: number): LayerDescription => ({
  kind: 'film',
  name,
  thickness_um,
  oxygen: { permeability_mol_m_per_m2_s_Pa: permeability * CUSTOMARY },
  water: { permeability_mol_m_per_m2_s_Pa: 1e-14 },
});
const evoh: LayerDescription = {
  kind: 'film',
  name: 'EVOH',
  thickness_um: 5,
  oxygen: {
    permeability_mol_m_per_m2_s_Pa: 10 * CUSTOMARY,
    reference_relative_humidity: 0.6,
    humidity_curve: { relative_humidity: [0.6, 0.8, 0.9], factor: [1, 9, 100] },
  },
  water: { permeability_mol_m_per_m2_s_Pa: 1e-13 },
};

describe('a wall at a condition of one’s own', () => {
  it.each([
    ['60', '1.97'],
    ['80', '15.8'],
    ['90', '78.2'],
  ])('PET 12 / EVOH 5 / LDPE 50 with %s %% on both sides reads %s', (humidity, figures) => {
    const read = readCondition(
      { temperature: '23', humidityOutside: humidity, humidityInside: humidity },
      'metric',
    );
    if ('faults' in read) throw new Error('the condition was refused');
    const wall = wallAtCondition([film('PET', 12, 1600), evoh, film('LDPE', 50, 177_165)], read.condition);
    const show = figuresIn('metric');
    expect(show.figures(wall.oxygenPermeanceSi, 'oxygen_permeance_mol_per_m2_s_Pa')).toBe(figures);
    expect(wall.wvtrGPerM2Day).toBe(0);
  });

  it('refuses what cannot be, at its field', () => {
    const read = readCondition({ temperature: '80', humidityOutside: '101', humidityInside: '' }, 'metric');
    expect('faults' in read && Object.keys(read.faults)).toEqual([
      'temperature',
      'humidityOutside',
      'humidityInside',
    ]);
  });
});
