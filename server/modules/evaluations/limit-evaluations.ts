import { AppError } from '../../http/app-error';

const WINDOW_MS = 60_000;
const MOST_PER_WINDOW = 600;

/** Evaluations per user and minute, counted in memory: a restart forgives, nothing else is at stake. */
export function limitEvaluations(nowMs: () => number = Date.now): (userId: string) => void {
  let windowStartMs = nowMs();
  const made = new Map<string, number>();
  return (userId) => {
    const elapsedMs = nowMs() - windowStartMs;
    if (elapsedMs >= WINDOW_MS) {
      windowStartMs = nowMs();
      made.clear();
    }
    const count = (made.get(userId) ?? 0) + 1;
    made.set(userId, count);
    if (count <= MOST_PER_WINDOW) return;
    const retryAfterS = Math.max(1, Math.ceil((WINDOW_MS - elapsedMs) / 1000));
    throw new AppError(
      'too_many_requests',
      `More than ${MOST_PER_WINDOW} evaluations in a minute. Wait ${retryAfterS} s.`,
      {
        retryAfterS,
      },
    );
  };
}
