import { evaluate, type EvaluationAnswer, type EvaluationDescription } from '../../../shared/engine';
import type { EnginePort } from '../../jobs/engine-workers';

/** Leg passes that stay well below 50 ms where nothing feels humidity: a leg is then a closed form. */
const MOST_INLINE_PASSES = 24;

/** Computations whose cost is known to be small run here, all others in a thread, so that nobody waits for them. */
export async function evaluateDescription(
  engine: EnginePort,
  description: EvaluationDescription,
): Promise<EvaluationAnswer> {
  const isSmall = !hasHumidityCurve(description) && legPasses(description) <= MOST_INLINE_PASSES;
  return isSmall ? evaluate(description) : engine.evaluate(description);
}

/** A curve's cost depends on its shape, so any curve counts as large. */
function hasHumidityCurve({ pack }: EvaluationDescription): boolean {
  const layers = pack.walls.flatMap((wall) => wall.layers);
  const gases = layers.flatMap((layer) => (layer.kind === 'foil' ? [] : [layer.oxygen, layer.water]));
  const sealGases = pack.seal ? [pack.seal.oxygen, pack.seal.water] : [];
  return [...gases, ...sealGases].some((gas) => gas.humidity_curve !== undefined);
}

/** How many legs are integrated until the horizon, with a surcharge for many layers. */
function legPasses({ route, pack, horizon_days: horizonDays }: EvaluationDescription): number {
  const cycleDays = route.legs.reduce((sum, leg) => sum + leg.days, 0);
  const cycles = route.after_last === 'repeat' && cycleDays > 0 ? Math.max(1, horizonDays / cycleDays) : 1;
  const layers = pack.walls.reduce((sum, wall) => sum + wall.layers.length, 0);
  return route.legs.length * cycles * Math.max(1, layers / 6);
}
