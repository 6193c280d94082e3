import { setTimeout as sleep } from 'node:timers/promises';
import { say } from './say.mjs';

/** @typedef {import('node:child_process').ChildProcess} ChildProcess */

const FIRST_PAUSE_MS = 250;
const LONGEST_PAUSE_MS = 15_000;
/** Having run this long, a process counts as healthy and its next fall is met with the first pause again. */
const HEALTHY_AFTER_MS = 30_000;

/**
 * Keeps one process running: when it ends without being asked, it is launched again after a pause that doubles.
 * @param {object} options
 * @param {string} options.name as the sentence begins: 'The server'
 * @param {() => Promise<ChildProcess>} options.launch
 * @param {(child: ChildProcess) => Promise<void>} options.end
 * @param {() => void} [options.onRelaunched]
 * @param {(falls: number) => Error | undefined} [options.giveUp] asked before each relaunch
 */
export async function supervise({ name, launch, end, onRelaunched, giveUp }) {
  let isStopping = false;
  let pauseMs = FIRST_PAUSE_MS;
  let falls = 0;
  let launchedAt = Date.now();
  let child = await launch();
  /** @type {(error: Error) => void} */
  let fail = () => undefined;
  /** Rejects when it is given up; never resolves. @type {Promise<never>} */
  const failed = new Promise((_, reject) => (fail = reject));
  failed.catch(() => undefined);

  const watching = watch().catch((error) => fail(error));
  return { stop, failed };

  async function watch() {
    while (!isStopping) {
      const ending = await endingOf(child);
      if (isStopping) return;
      if (Date.now() - launchedAt > HEALTHY_AFTER_MS) pauseMs = FIRST_PAUSE_MS;
      falls += 1;
      const reason = giveUp?.(falls);
      if (reason) throw reason;
      say(`${name} ended unexpectedly (${ending}); starting it again in ${pauseMs / 1000} s.`);
      await sleep(pauseMs);
      pauseMs = Math.min(pauseMs * 2, LONGEST_PAUSE_MS);
      if (isStopping) return;
      await relaunch();
    }
  }

  async function relaunch() {
    launchedAt = Date.now();
    try {
      child = await launch();
    } catch (error) {
      say(`${name} did not start: ${error instanceof Error ? error.message : String(error)}`);
      return;
    }
    if (!isStopping) onRelaunched?.();
  }

  async function stop() {
    isStopping = true;
    await end(child);
    await watching;
    await end(child);
  }
}

/** @param {ChildProcess} child @returns {Promise<string>} */
function endingOf(child) {
  const words = () => (child.signalCode ? `by ${child.signalCode}` : `with code ${child.exitCode}`);
  if (child.exitCode !== null || child.signalCode !== null) return Promise.resolve(words());
  return new Promise((resolve) => child.once('exit', () => resolve(words())));
}
