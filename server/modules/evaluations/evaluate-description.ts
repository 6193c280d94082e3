import { evaluate, type EvaluationAnswer, type EvaluationDescription } from '../../../shared/engine';
import type { EnginePort } from '../../jobs/engine-workers';

/** Leg passes that stay well below 50 ms with few points on humidity curves. */
const MOST_INLINE_PASSES = 24;
/** All curves together: a usual barrier layer has eight. A curve's cost grows with its points and its zigzags. */
const MOST_INLINE_CURVE_POINTS = 40;

/** Computations whose cost is known to be small run here, all others in a thread, so that nobody waits for them. */
export async function evaluateDescription(
  engine: EnginePort,
  description: EvaluationDescription,
): Promise<EvaluationAnswer> {
  const isSmall =
    curvePoints(description) <= MOST_INLINE_CURVE_POINTS && legPasses(description) <= MOST_INLINE_PASSES;
  return isSmall ? evaluate(description) : engine.evaluate(description);
}

function curvePoints({ pack }: EvaluationDescription): number {
  const layers = pack.walls.flatMap((wall) => wall.layers);
  const gases = layers.flatMap((layer) => (layer.kind === 'foil' ? [] : [layer.oxygen, layer.water]));
  const sealGases = pack.seal ? [pack.seal.oxygen, pack.seal.water] : [];
  return [...gases, ...sealGases].reduce((sum, gas) => sum + (gas.humidity_curve?.factor.length ?? 0), 0);
}

/** How many legs are integrated until the horizon, with a surcharge for many layers. */
function legPasses({ route, pack, horizon_days: horizonDays }: EvaluationDescription): number {
  const cycleDays = route.legs.reduce((sum, leg) => sum + leg.days, 0);
  const cycles = route.after_last === 'repeat' && cycleDays > 0 ? Math.max(1, horizonDays / cycleDays) : 1;
  const layers = pack.walls.reduce((sum, wall) => sum + wall.layers.length, 0);
  return route.legs.length * cycles * Math.max(1, layers / 6);
}
