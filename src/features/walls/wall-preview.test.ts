import { describe, expect, it } from 'vitest';
import { gasFromStated, type LayerDescription } from '../../../shared/engine';
import { formatQuantity } from '../../../shared/units/format';
import { turnedRoundOf } from './turned-round';
import { turnedRoundInWords } from './turned-round-words';
import { stateBetween, wallPreview } from './wall-preview';

/** Oxygen as the check of the whole product states it; water typical for each. */
function film(
  name: string,
  thickness_um: number,
  oxygen: { value: number; curve?: [number, number][] },
  water: number,
): LayerDescription {
  const curve = oxygen.curve;
  return {
    kind: 'film',
    name,
    thickness_um,
    oxygen: gasFromStated({
      gas: 'oxygen',
      kind: 'film',
      value: oxygen.value,
      unit: 'cm3(STP)*um/(m2*day*atm)',
      temperature_C: 23,
      relative_humidity: curve === undefined ? 0 : 0.6,
      ...(curve === undefined
        ? {}
        : { humidity_curve: { relative_humidity: curve.map(([h]) => h), factor: curve.map(([, f]) => f) } }),
    }),
    water: gasFromStated({
      gas: 'water',
      kind: 'film',
      value: water,
      unit: 'g*um/(m2*day)',
      temperature_C: 38,
      relative_humidity_high: 0.9,
      relative_humidity_low: 0,
    }),
  };
}

const WALL = [
  film('PET', 12, { value: 1600 }, 557),
  film(
    'EVOH',
    5,
    {
      value: 10,
      curve: [
        [0.6, 1],
        [0.8, 9],
        [0.9, 100],
      ],
    },
    1500,
  ),
  film('LDPE', 50, { value: 177165 }, 467),
];

describe('wallPreview', () => {
  it.each([
    [0.6, '1.97'],
    [0.8, '15.8'],
    [0.9, '78.2'],
  ])('PET 12 / EVOH 5 / LDPE 50 at %d on both sides reads %s cm³/(m²·day·atm)', (humidity, figures) => {
    const state = stateBetween(WALL, {
      temperature_C: 23,
      relative_humidity_outside: humidity,
      relative_humidity_inside: humidity,
    });
    const shown = formatQuantity(state.oxygen.permeance_mol_per_m2_s_Pa, 'oxygen_permeance_mol_per_m2_s_Pa', {
      unitSystem: 'metric',
    });
    expect(shown.figures).toBe(figures);
  });

  it('answers nothing for a wall that cannot be computed with', () => {
    const sides = { temperature_C: 23, relative_humidity_outside: 0.5, relative_humidity_inside: 0.5 };
    expect(wallPreview([], sides)).toBeNull();
    expect(wallPreview(WALL, { ...sides, relative_humidity_outside: 1.2 })).toBeNull();
    expect(wallPreview([{ ...WALL[0]!, thickness_um: NaN }], sides)).toBeNull();
  });
});

describe('turning round', () => {
  const sides = { temperature_C: 23, relative_humidity_outside: 0.75, relative_humidity_inside: 0.3 };

  it('says how much, and at which humidity the sensitive layer then sits', () => {
    const comparison = turnedRoundOf(WALL, sides);
    expect(comparison.sensitive?.name).toBe('EVOH');
    // PE outside keeps the moist air away from EVOH: turned round it is drier and tighter.
    expect(comparison.turned.oxygenPermeanceSi).toBeLessThan(comparison.asBuilt.oxygenPermeanceSi);
    expect(turnedRoundInWords(comparison, 'metric')).toMatch(
      /^Turned round, only [\d.]+ % of the oxygen passes: [\d.]+ instead of [\d.]+\scm³\/\(m²·day·atm\)\. EVOH then sits at \d+ % humidity instead of \d+ % humidity, where it holds oxygen better\.$/u,
    );
  });

  it('says so where no layer feels humidity', () => {
    const plain = turnedRoundOf([WALL[0]!, WALL[2]!], sides);
    expect(turnedRoundInWords(plain, 'metric')).toContain('no layer of this wall feels humidity');
  });
});
