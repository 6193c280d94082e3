import type { EngineWarning } from '../../../shared/engine/description/evaluation';
import type { Candidate, CandidateLayer } from '../../../shared/contract/studies';
import { decidingLeg } from './deciding-leg';
import { engineWords } from './engine-words';
import type { Figures } from './use-figures';

/** Always beside an estimate: what it is not. The first sentence stands in sight, the rest one press away. */
export const ALWAYS_SAID = {
  short: 'An estimate, not a proof: confirm by storage tests before a date goes on a pack.',
  more: [
    'It says nothing about microbial safety. A low-oxygen pack of a low-acid, moist food can be dangerous; that is for a qualified process authority.',
    'Food-contact compliance, allergens and recyclability claims follow local law.',
    'Seals, folds and flexing in real packs usually cost barrier that flat-film data do not show.',
  ],
} as const;

const LEANING: Record<CandidateLayer['leans_on'][number], string> = {
  memory: 'some of their numbers are from memory',
  invented: 'some of their numbers are invented for the demo',
  'common-practice': 'some of their numbers are common practice, not measured',
};

/** A layer that holds less than this of both gases moves no answer. */
const COUNTS_FROM = 0.01;
/** The lesser share of a layer is named only where it is worth a figure. */
const LESSER_FROM = 0.1;
/** What the wall itself does not weigh (seal, leaks, rates) stands after layers that hold this much. */
const UNWEIGHED = 0.5;

export interface WeighedCautions {
  /** The weightiest first. */
  weighty: string[];
  /** Of layers that hold next to nothing. */
  slight: string[];
}

interface Shares {
  oxygen: number;
  water: number;
}

/** What the answer rests on, weighed by the share of the resistance that each layer holds where it counts. */
export function answerCautions(
  candidate: Candidate,
  options: { trayLayers?: CandidateLayer[] | undefined; show: Figures },
): WeighedCautions {
  const { trayLayers = [], show } = options;
  const shares = candidate.answer.walls.map((_wall, index) => sharesOnDecidingLeg(candidate, index));
  const layers = [
    ...weighedLayers(candidate.layers, { shares: shares[0] ?? [], where: '' }),
    ...weighedLayers(trayLayers, { shares: shares[1] ?? [], where: 'tray, ' }),
  ];
  const weighty: string[] = [];
  const slight: string[] = [];
  for (const ground of ['invented', 'memory', 'common-practice'] as const) {
    const leaning = layers
      .filter((layer) => layer.grounds.has(ground))
      .sort((a, b) => weightOf(b.shares) - weightOf(a.shares));
    const counting = leaning.filter((layer) => weightOf(layer.shares) >= COUNTS_FROM);
    const rest = leaning.length - counting.length;
    const names = counting.map((layer) => `${layer.name} (${shareWords(layer, show.percent)})`);
    if (names.length > 0) {
      weighty.push(`${names.join(', ')}${rest > 0 ? `, ${rest} more` : ''}: ${LEANING[ground]}.`);
    } else if (rest > 0) {
      slight.push(
        `${leaning.map(({ name }) => name).join(', ')}, under 1 % of both gases: ${LEANING[ground]}.`,
      );
    }
  }
  const said = weighedWarnings(candidate.answer.warnings, { shares, show });
  return {
    weighty: [...weighty, ...said.weighty],
    slight: [...slight, ...said.slight],
  };
}

function sharesOnDecidingLeg(candidate: Candidate, wall: number): Shares[] {
  const { leg: legNumber } = decidingLeg(candidate, wall);
  const leg = candidate.answer.walls[wall]?.legs.find((one) => one.leg === legNumber);
  return (leg?.oxygen.resistance_share ?? []).map((oxygen, index) => ({
    oxygen,
    water: leg?.water.resistance_share[index] ?? 0,
  }));
}

interface WeighedLayer {
  name: string;
  where: string;
  shares: Shares;
  grounds: Set<CandidateLayer['leans_on'][number]>;
}

/** One for each material: a film laid twice holds its shares together. */
function weighedLayers(
  layers: CandidateLayer[],
  { shares, where }: { shares: Shares[]; where: string },
): WeighedLayer[] {
  const byName = new Map<string, WeighedLayer>();
  layers.forEach((layer, index) => {
    const held = shares[index] ?? { oxygen: 0, water: 0 };
    const before = byName.get(layer.material_name);
    byName.set(layer.material_name, {
      name: layer.material_name,
      where,
      shares: {
        oxygen: (before?.shares.oxygen ?? 0) + held.oxygen,
        water: (before?.shares.water ?? 0) + held.water,
      },
      grounds: new Set([...(before?.grounds ?? []), ...layer.leans_on]),
    });
  });
  return [...byName.values()];
}

function weightOf({ oxygen, water }: Shares): number {
  return Math.max(oxygen, water);
}

/** '81 % of the water resistance', with the other gas where it holds much of that too. */
function shareWords({ shares, where }: WeighedLayer, percent: (fraction: number) => string): string {
  const gases = (
    shares.oxygen >= shares.water ? ['oxygen', 'water'] : ['water', 'oxygen']
  ) as (keyof Shares)[];
  const told = gases.filter((gas, index) => index === 0 || shares[gas] >= LESSER_FROM);
  return `${where}${told.map((gas) => `${percent(shares[gas])} of the ${gas} resistance`).join(', ')}`;
}

const LAYER_PATH = /^pack\.walls\[(\d+)\]\.layers\[(\d+)\](?:\.(oxygen|water))?/;
/** Said elsewhere on the same screen, in their own place. */
const SAID_ELSEWHERE: EngineWarning['code'][] = ['orientation_matters', 'limit_passed_at_packing'];

function weighedWarnings(
  warnings: EngineWarning[],
  { shares, show }: { shares: Shares[][]; show: Figures },
): WeighedCautions {
  const weighed = new Map<string, number>();
  for (const warning of warnings) {
    if (SAID_ELSEWHERE.includes(warning.code)) continue;
    const words = engineWords(warning.message, show);
    weighed.set(words, Math.max(weighed.get(words) ?? 0, warningWeight(warning.path, shares)));
  }
  const sorted = [...weighed].sort(([, a], [, b]) => b - a);
  return {
    weighty: sorted.filter(([, weight]) => weight >= COUNTS_FROM).map(([words]) => words),
    slight: sorted.filter(([, weight]) => weight < COUNTS_FROM).map(([words]) => words),
  };
}

function warningWeight(path: string, shares: Shares[][]): number {
  const [, wall, layer, gas] = LAYER_PATH.exec(path) ?? [];
  const held = wall === undefined || layer === undefined ? undefined : shares[Number(wall)]?.[Number(layer)];
  if (held === undefined) return UNWEIGHED;
  return gas === 'oxygen' || gas === 'water' ? held[gas] : weightOf(held);
}

/** Of the wall shown. */
export function layersFromMemory(layers: CandidateLayer[]): { fromMemory: number; all: number } {
  return {
    fromMemory: layers.filter((layer) => layer.leans_on.includes('memory')).length,
    all: layers.length,
  };
}
