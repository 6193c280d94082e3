import type { EvaluationAnswer, EvaluationDescription } from '../../../shared/engine';
import { AppError } from '../../http/app-error';
import type { EnginePort } from '../../jobs/engine-workers';

const COURSE_POINTS = 160;
/** The chart goes a little past the last thing on it. */
const ROOM = 1.25;

/**
 * Two passes: the first finds the days, the second draws the courses over a span that shows them and the target.
 * Both give the same days; the second one is kept, with its description.
 */
export async function computeCandidate(
  engine: EnginePort,
  description: EvaluationDescription,
): Promise<{ description: EvaluationDescription; answer: EvaluationAnswer }> {
  const first = await engine.evaluate({ ...description, tests: [] });
  if (first.solver.status === 'step limit reached') {
    throw new AppError(
      'computation_too_long',
      'This route is too long to be followed to its horizon. Give it fewer or longer legs, or a shorter horizon.',
    );
  }
  const withCourses = { ...description, report_days: reportDays(description, first) };
  return { description: withCourses, answer: await engine.evaluate(withCourses) };
}

function reportDays(
  { target_days, horizon_days }: EvaluationDescription,
  answer: EvaluationAnswer,
): number[] {
  const reached = Object.values(answer.limits).flatMap((limit) =>
    limit.status === 'reached' ? [limit.days] : [],
  );
  // A limit far beyond target and life would squeeze what matters into a corner.
  const mattering = [target_days ?? 0, answer.shelf_life_days ?? 0];
  const near = reached.filter((days) => days <= 3 * Math.max(...mattering));
  const wished = ROOM * Math.max(1, ...mattering, ...near);
  const lastDay = Math.min(horizon_days, wished);
  return Array.from({ length: COURSE_POINTS + 1 }, (_, i) =>
    Number(((lastDay * i) / COURSE_POINTS).toPrecision(12)),
  );
}
