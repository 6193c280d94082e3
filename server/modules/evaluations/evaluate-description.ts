import { evaluate, type EvaluationAnswer, type EvaluationDescription } from '../../../shared/engine';
import type { EnginePort } from '../../jobs/engine-workers';

/** Leg passes times walls that stay well below 50 ms on the machine this was measured on (a leg takes about 1 ms). */
const MOST_INLINE_PASSES = 24;

/** Short computations run here, long ones in a thread, so that nobody else waits for them. */
export async function evaluateDescription(
  engine: EnginePort,
  description: EvaluationDescription,
): Promise<EvaluationAnswer> {
  return legPasses(description) <= MOST_INLINE_PASSES ? evaluate(description) : engine.evaluate(description);
}

/** How many legs are integrated until the horizon, over all walls, with a surcharge for humidity curves. */
function legPasses({ route, pack, horizon_days: horizonDays }: EvaluationDescription): number {
  const cycleDays = route.legs.reduce((sum, leg) => sum + leg.days, 0);
  const cycles = route.after_last === 'repeat' && cycleDays > 0 ? Math.max(1, horizonDays / cycleDays) : 1;
  const layers = pack.walls.reduce((sum, wall) => sum + wall.layers.length, 0);
  return route.legs.length * cycles * Math.max(1, layers / 6);
}
