import { legSpans } from '../../../shared/charts/leg-spans';
import type { Candidate } from '../../../shared/contract/studies';
import { LIMIT_WORDS, daysFigures, type LimitGas } from './answer-words';

export interface DecidingLeg {
  leg: number;
  /** Why this leg is opened first. */
  reason: string;
}

/** The gas that ends it; null where no limit is reached. */
export function endingGas({ answer }: Pick<Candidate, 'answer'>): LimitGas | null {
  return answer.first_limit === null ? null : LIMIT_WORDS[answer.first_limit].gas;
}

/**
 * The leg that brings most of what ends the life through a wall: its rate as the leg begins times the days spent on
 * it up to the end. The first leg where nothing ends it, or where it ends before any leg has run.
 */
export function decidingLeg(
  { answer, description }: Pick<Candidate, 'answer' | 'description'>,
  wall: number,
): DecidingLeg {
  const legs = answer.walls[wall]?.legs ?? [];
  const first = legs[0]?.leg ?? 0;
  const gas = endingGas({ answer });
  const endDay = answer.shelf_life_days;
  if (gas === null || endDay === null) {
    return { leg: first, reason: 'No limit is reached, so the first leg is opened.' };
  }
  if (endDay === 0) {
    return { leg: first, reason: 'It ends before any leg has run, so the first is opened.' };
  }
  const isDrying = answer.first_limit === 'moisture_min_g_per_g';
  const daysOn = daysPerLeg(description, endDay);
  let most = 0;
  let leg = first;
  for (const one of legs) {
    const inwards = one[gas].flux_mol_per_m2_s * (isDrying ? -1 : 1);
    const amount = inwards * (daysOn.get(one.leg) ?? 0);
    if (amount > most) {
      most = amount;
      leg = one.leg;
    }
  }
  if (most === 0) return { leg: first, reason: 'No leg stands out, so the first is opened.' };
  const what = gas === 'oxygen' ? 'oxygen' : 'water vapour';
  return {
    leg,
    reason: `Leg ${leg + 1} is opened first: it lets ${isDrying ? 'out' : 'in'} the most ${what} up to day ${daysFigures(endDay)}, by its rate as it begins times its days.`,
  };
}

function daysPerLeg(description: Candidate['description'], endDay: number): Map<number, number> {
  const { legs, after_last: afterLast } = description.route;
  const days = new Map<number, number>();
  const spans = legSpans(
    legs.map((leg) => leg.days),
    afterLast,
    endDay,
  );
  for (const { leg, startDay, endDay: spanEnd } of spans) {
    days.set(leg, (days.get(leg) ?? 0) + spanEnd - startDay);
  }
  return days;
}
