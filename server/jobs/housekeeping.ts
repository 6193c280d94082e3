import type { Logger } from 'pino';

const EVERY_MS = 15 * 60_000;

/** Runs chores now and then; one that fails is tried again the next time. Returns how to stop. */
export function startHousekeeping({
  chores,
  logger,
}: {
  chores: readonly (() => Promise<void>)[];
  logger: Logger;
}): () => void {
  const timer = setInterval(() => {
    for (const chore of chores) {
      chore().catch((error: unknown) => logger.warn({ err: error }, 'housekeeping'));
    }
  }, EVERY_MS);
  timer.unref();
  return () => clearInterval(timer);
}
