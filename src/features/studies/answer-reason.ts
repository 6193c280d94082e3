import type { Candidate } from '../../../shared/contract/studies';
import { decidingLeg, endingGas } from './deciding-leg';
import { engineWords } from './engine-words';
import type { Figures } from './use-figures';

/** Below this part of a gas's way in, what else lets it in is worth a sentence. */
const MOSTLY_THE_WALL = 0.9;

/** Why it ends as it does: the layer that holds most against the gas that ends it, or why there was no time at all. */
export function answerReason(
  candidate: Pick<Candidate, 'answer' | 'description'>,
  wall: number,
  show: Figures,
): string[] {
  const { answer } = candidate;
  const gas = endingGas(candidate);
  if (gas === null) return [];
  if (answer.shelf_life_days === 0) {
    return answer.warnings
      .filter(
        ({ code, path }) => code === 'limit_passed_at_packing' && path === `limits.${answer.first_limit}`,
      )
      .map(({ message }) => `${engineWords(message, show)}${moistureAsPacked(candidate, show)}`);
  }
  const { leg: legNumber } = decidingLeg(candidate, wall);
  const leg = answer.walls[wall]?.legs.find((one) => one.leg === legNumber);
  if (leg === undefined) return [];
  const shares = leg[gas].resistance_share;
  const best = shares.reduce((most, share, index) => (share > (shares[most] ?? 0) ? index : most), 0);
  const bestShare = shares[best] ?? 0;
  const layer = answer.walls[wall]?.layers[best];
  const what = gas === 'oxygen' ? 'oxygen' : 'water vapour';
  const onLeg = candidate.description.route.legs.length > 1 ? ` on leg ${legNumber + 1}` : '';
  const holds =
    layer === undefined || !(bestShare > 0)
      ? []
      : [
          `${layer.name} holds ${show.percent(bestShare)} of the wall’s resistance to ${what}${onLeg}${bestShare < 0.5 ? ', more than any other layer' : ''}.`,
        ];
  return [...holds, ...besidesTheWall(candidate, { wall, leg: legNumber, gas, percent: show.percent })];
}

/** The engine gives the numbers for oxygen; for moisture they stand in the description. */
function moistureAsPacked(
  { answer, description }: Pick<Candidate, 'answer' | 'description'>,
  show: Figures,
): string {
  const name = answer.first_limit;
  if (name !== 'moisture_max_g_per_g' && name !== 'moisture_min_g_per_g') return '';
  const packed = description.food.initial_moisture_g_per_g;
  const limit = description.limits[name];
  if (packed === undefined || limit === undefined) return '';
  const remedy = name === 'moisture_max_g_per_g' ? 'pack it drier' : 'pack it moister';
  return ` The food is packed at ${show.exact(packed, 'moisture_g_per_g')}, the limit is ${show.exact(limit, 'moisture_g_per_g')}: ${remedy}, or look at the limit again.`;
}

interface BesidesOptions {
  wall: number;
  leg: number;
  gas: 'oxygen' | 'water';
  percent: (fraction: number) => string;
}

function besidesTheWall({ answer }: Pick<Candidate, 'answer'>, options: BesidesOptions): string[] {
  const { wall, leg, gas, percent } = options;
  const ways = answer.pack.find((one) => one.leg === leg)?.[gas];
  if (ways === undefined || !(ways.total_mol_per_s_Pa > 0)) return [];
  const throughWall = (ways.walls_mol_per_s_Pa[wall] ?? 0) / ways.total_mol_per_s_Pa;
  if (throughWall >= MOSTLY_THE_WALL) return [];
  const otherWalls = ways.walls_mol_per_s_Pa.some((way, index) => index !== wall && way > 0);
  const others = [
    ...(otherWalls ? ['the rest of the pack'] : []),
    ...(ways.seal_mol_per_s_Pa > 0 ? ['the seal'] : []),
    ...(ways.leaks_mol_per_s_Pa > 0 ? ['leaks'] : []),
  ];
  if (others.length === 0) return [];
  const listed = others.length > 1 ? `${others.slice(0, -1).join(', ')} and ${others.at(-1)}` : others[0];
  return [
    `Through the wall passes ${percent(throughWall)} of what the pack lets pass; the rest goes by ${listed}.`,
  ];
}
