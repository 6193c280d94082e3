import type { Candidate } from '../../../shared/contract/studies';
import type { StoredHeadline } from '../../db/schema';

/** The best candidate: one that meets the target before one that does not, then the longer life. */
export function headlineOf(candidates: readonly Candidate[]): StoredHeadline {
  const [best] = [...candidates].sort((one, other) => rank(other) - rank(one));
  if (!best) throw new Error('A study has at least one candidate.');
  return {
    best_laminate_name: best.name,
    shelf_life_days: best.answer.shelf_life_days,
    horizon_days: best.description.horizon_days,
    first_limit: best.answer.first_limit,
    is_met: best.answer.target?.is_met ?? false,
  };
}

const ABOVE_ANY_HORIZON = 1e6;

function rank({ answer }: Candidate): number {
  return (answer.shelf_life_days ?? ABOVE_ANY_HORIZON) + (answer.target?.is_met ? 2 * ABOVE_ANY_HORIZON : 0);
}
