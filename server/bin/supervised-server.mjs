import path from 'node:path';
import { DATABASE, databaseEnv } from './databases.mjs';
import { findFreePortFrom, isPortFree } from './free-port.mjs';
import { LOG_FOLDER, inProject } from './paths.mjs';
import { isListeningOn } from './port-owner.mjs';
import { Remedy, say } from './say.mjs';
import { endServer, lastServerLines, launchServer, waitForHealth } from './server-process.mjs';
import { supervise } from './supervise.mjs';

/** @typedef {import('./cluster.mjs').Cluster} Cluster */
/** @typedef {import('node:child_process').ChildProcess} ChildProcess */

const DEFAULT_PORT = 4310;
/** A server that falls this often before it has ever answered will not answer at all. */
const FALLS_BEFORE_FIRST_ANSWER = 4;
const FIRST_ANSWER_PATIENCE_MS = 120_000;
const NEXT_ANSWER_PATIENCE_MS = 60_000;

/**
 * Starts the server on the wished port or the next free one and keeps it running.
 * @param {Cluster} cluster
 * @param {{isWatching: boolean, isStopping: () => boolean}} options
 */
export async function superviseServer(cluster, { isWatching, isStopping }) {
  const wishedPort = Number(process.env.PORT || DEFAULT_PORT);
  let port = wishedPort;
  let hasAnswered = false;
  /** @type {ChildProcess | undefined} */
  let child;

  const launch = async () => {
    // The address is promised once it has been printed; until then another port will do.
    if (!hasAnswered && !(await isPortFree(port))) {
      port = await findFreePortFrom(port + 1);
      say(`Port ${wishedPort} is taken by another program; using ${port}.`);
    }
    child = launchServer({ env: serverEnv(cluster, port), isWatching });
    return child;
  };
  /** The watching tsx runs the server as a child of its own: there any answer will do. */
  const isOurs = () => isWatching || (child?.pid !== undefined && isListeningOn(child.pid, port));
  const explain = (/** @type {string} */ what) =>
    new Remedy(`${what} The end of ${path.join(LOG_FOLDER, 'server.log')}:\n${lastServerLines()}`);

  const supervised = await supervise({
    name: 'The server',
    launch,
    end: endServer,
    onRelaunched: () => {
      if (hasAnswered) void sayWhenItRunsAgain();
    },
    giveUp: (falls) =>
      hasAnswered || falls < FALLS_BEFORE_FIRST_ANSWER ? undefined : explain('The server does not start.'),
  });
  return { ...supervised, waitForFirstAnswer, restart: () => child?.kill('SIGTERM') };

  /** @returns {Promise<string>} the address */
  async function waitForFirstAnswer() {
    const health = waitForHealth(() => port, {
      patienceMs: FIRST_ANSWER_PATIENCE_MS,
      isOver: isStopping,
      isOurs,
    });
    hasAnswered = await Promise.race([health, supervised.failed]);
    if (!hasAnswered && !isStopping()) throw explain('The server does not answer.');
    return process.env.PUBLIC_URL || `http://127.0.0.1:${port}`;
  }

  async function sayWhenItRunsAgain() {
    const options = { patienceMs: NEXT_ANSWER_PATIENCE_MS, isOver: isStopping, isOurs };
    if (await waitForHealth(() => port, options)) say('The server runs again.');
  }
}

/**
 * @param {Cluster} cluster
 * @param {number} port
 * @returns {Record<string, string | undefined>}
 */
function serverEnv(cluster, port) {
  const { DATABASE_URL } = databaseEnv(cluster, DATABASE);
  const WEB_DIR = process.env.WEB_DIR || inProject('dist');
  return { DATABASE_URL, DATABASE_OWNER_URL: undefined, PORT: String(port), WEB_DIR };
}
