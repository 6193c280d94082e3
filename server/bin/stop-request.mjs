import { readFileSync } from 'node:fs';
import { endRunningPrograms } from './run-program.mjs';

/**
 * Ctrl-C, SIGTERM, SIGHUP or the end of the npm that started us. The first asks for an orderly end; more of them
 * change nothing, since npm passes on what the terminal has already sent.
 * @typedef {{isMade: boolean, made: Promise<void>}} StopRequest
 */

/** @returns {StopRequest} */
export function listenForStopRequest() {
  /** @type {() => void} */
  let resolve = () => undefined;
  /** @type {StopRequest} */
  const request = { isMade: false, made: new Promise((done) => (resolve = done)) };
  const stop = () => {
    if (request.isMade) return;
    request.isMade = true;
    endRunningPrograms();
    resolve();
  };
  for (const name of /** @type {const} */ (['SIGINT', 'SIGTERM', 'SIGHUP'])) process.on(name, stop);
  if (process.env.npm_lifecycle_event !== undefined) stopWhenParentEnds(stop);
  return request;
}

/** npm that is killed passes nothing on. Between npm and us there may be a shell. @param {() => void} stop */
function stopWhenParentEnds(stop) {
  const parent = process.ppid;
  const grandparent = parentOf(parent);
  setInterval(() => {
    if (process.ppid !== parent || parentOf(parent) !== grandparent) stop();
  }, 500).unref();
}

/** @param {number} pid */
function parentOf(pid) {
  try {
    const stat = readFileSync(`/proc/${pid}/stat`, 'utf8');
    return stat.slice(stat.lastIndexOf(')') + 2).split(' ')[1];
  } catch {
    return undefined;
  }
}
