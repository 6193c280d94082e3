import { describe, expect, it } from 'vitest';
import type { Candidate, CandidateLayer } from '../../../shared/contract/studies';
import { evaluate } from '../../../shared/engine';
import type { EvaluationDescription } from '../../../shared/engine/description/evaluation';
import { answerCautions, layersFromMemory } from './answer-cautions';
import { answerReason } from './answer-reason';
import { decidingLeg } from './deciding-leg';
import { engineWords } from './engine-words';
import { sideBySideRows } from './side-by-side';
import { figuresIn } from './use-figures';

const show = figuresIn('metric');
const plain = (words: string) => words.replaceAll('\u00a0', ' ');

function film(name: string, thickness_um: number, permeability: { oxygen: number; water: number }) {
  return {
    kind: 'film' as const,
    name,
    thickness_um,
    oxygen: { permeability_mol_m_per_m2_s_Pa: permeability.oxygen },
    water: { permeability_mol_m_per_m2_s_Pa: permeability.water },
  };
}

const description: EvaluationDescription = {
  pack: {
    walls: [
      {
        name: 'wall',
        area_m2: 0.05,
        layers: [
          film('HDPE', 50, { oxygen: 4e-16, water: 5e-15 }),
          film('EVOH', 5, { oxygen: 2e-20, water: 2e-12 }),
          film('tie', 5, { oxygen: 9e-16, water: 5e-13 }),
        ],
      },
    ],
  },
  food: {
    mass_kg: 0.2,
    oxygen_mode: 'at_once',
    isotherm: { type: 'linear', slope_g_per_g: 0.2, intercept_g_per_g: 0.01 },
    initial_moisture_g_per_g: 0.03,
  },
  route: {
    legs: [
      { temperature_C: 20, relative_humidity: 0.4, days: 5 },
      { temperature_C: 30, relative_humidity: 0.85, days: 60 },
    ],
    after_last: 'repeat',
  },
  limits: { moisture_max_g_per_g: 0.06 },
  horizon_days: 3650,
};

const layer = (material_name: string, leans_on: CandidateLayer['leans_on']): CandidateLayer => ({
  material_id: material_name,
  material_revision_id: material_name,
  material_name,
  material_class: 'polyolefin',
  polymer_family: 'PE',
  kind: 'film',
  thickness_um: 10,
  leans_on,
});

function candidateOf(changed: Partial<EvaluationDescription> = {}): Candidate {
  const whole = { ...description, ...changed };
  return {
    laminate_id: 'wall',
    laminate_revision_id: 'wall',
    name: 'HDPE / EVOH / tie',
    layers: [layer('HDPE', ['memory']), layer('EVOH', ['memory']), layer('tie', ['memory'])],
    description: whole,
    answer: evaluate(whole),
    make_up: {
      mass_g_per_m2: null,
      cut_area_m2: 0.05,
      mass_g_per_pack: null,
      mass_missing: ['tie'],
      price_per_pack: 0.0234,
      currency: 'EUR',
      price_missing: [],
      family_shares: [],
      light: { uv_350nm: 0.5, visible_550nm: 0.9 },
      light_missing: [],
    },
  };
}

describe('an answer weighed', () => {
  it('opens on the leg that brings most of what ends it', () => {
    const candidate = candidateOf();
    expect(candidate.answer.first_limit).toBe('moisture_max_g_per_g');
    expect(decidingLeg(candidate, 0).leg).toBe(1);
    expect(decidingLeg(candidate, 0).reason).toMatch(
      /^Leg 2 is opened first: it lets in the most water vapour/,
    );
  });

  it('names what holds most against the gas that ends it', () => {
    expect(plain(answerReason(candidateOf(), 0, show)[0] ?? '')).toMatch(
      /^HDPE holds 99\.\d % of the wall’s resistance to water vapour on leg 2\.$/,
    );
  });

  it('says why there was no time at all', () => {
    const candidate = candidateOf({ limits: { moisture_max_g_per_g: 0.02 } });
    expect(candidate.answer.shelf_life_days).toBe(0);
    const passed = candidate.answer.warnings.find(({ code }) => code === 'limit_passed_at_packing');
    expect(answerReason(candidate, 0, show).map(plain)).toEqual([
      `${passed?.message} The food is packed at 3 g/100 g dry, the limit is 2 g/100 g dry: pack it drier, or look at the limit again.`,
    ]);
    const { weighty, slight } = answerCautions(candidate, { show });
    expect([...weighty, ...slight]).not.toContain(passed?.message);
  });

  it('names layers with the gas they hold, the biggest share first, and counts the rest', () => {
    const words = plain(answerCautions(candidateOf(), { show }).weighty[0] ?? '');
    expect(words).toMatch(
      /^EVOH \(\S+ % of the oxygen resistance\), HDPE \(99\.\d % of the water resistance\), 1 more: some of their numbers are from memory\.$/,
    );
  });

  it('counts the layers of one wall', () => {
    expect(layersFromMemory([layer('PET', []), layer('PE', ['memory', 'invented'])])).toEqual({
      fromMemory: 1,
      all: 2,
    });
  });
});

describe('walls side by side', () => {
  const options = {
    targetDays: 270,
    notes: [{ laminate_id: 'wall', verdict: 'chosen' as const, note: 'Runs on line 2.' }],
    show,
  };

  it('names what is missing instead of a figure', () => {
    const [row] = sideBySideRows([candidateOf()], options);
    expect(plain(row?.price.figures ?? '')).toBe('0.0234 EUR');
    expect(row?.mass).toEqual({ figures: '–', missing: 'no density: tie' });
    expect(row?.verdict).toBe('chosen');
    expect(row?.note).toBe('Runs on line 2.');
  });

  it('bears a result from before make-ups were kept', () => {
    const { make_up: _none, ...older } = candidateOf();
    const [row] = sideBySideRows([older as Candidate], options);
    expect(row?.price).toEqual({ figures: '–', missing: 'not in this older result; run it again' });
  });
});

describe('what the engine says', () => {
  it('is said in the reader’s units', () => {
    const words = engineWords(
      'film, water: measured from 10 °C to 40 °C; -18 °C lies more than 15 K outside.',
      {
        ...figuresIn('us_customary'),
      },
    );
    expect(plain(words)).toBe(
      'Film, water: measured from 50 °F to 104 °F; -0.4 °F lies more than 27 °F outside.'.replace('-', '−'),
    );
  });
});
