import { spawn } from 'node:child_process';
import { closeSync, mkdirSync, openSync, readFileSync } from 'node:fs';
import path from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';
import { endChild } from './cluster.mjs';
import { LOG_FOLDER, ROOT, RUN_FOLDER, inProject } from './paths.mjs';
import { forgetProcess, recordProcess } from './process-record.mjs';
import { cacheEnv, signalGroup } from './run-program.mjs';

/** @typedef {import('node:child_process').ChildProcess} ChildProcess */

export const SERVER_RECORD = path.join(RUN_FOLDER, 'server.json');
const LOG = path.join(LOG_FOLDER, 'server.log');
const host = process.env.HOST ?? '127.0.0.1';
/** Where the server can be asked: the address it listens on, or loopback where it listens on all. */
const HEALTH_HOST = ['0.0.0.0', '::', ''].includes(host)
  ? '127.0.0.1'
  : host.includes(':')
    ? `[${host}]`
    : host;

/**
 * Starts the server in a process group of its own; its log goes to a file.
 * @param {{env: Record<string, string | undefined>, isWatching: boolean}} options
 * @returns {ChildProcess}
 */
export function launchServer({ env, isWatching }) {
  mkdirSync(LOG_FOLDER, { recursive: true });
  const log = openSync(LOG, 'a', 0o600);
  const watching = [inProject('node_modules', 'tsx', 'dist', 'cli.mjs'), 'watch', '--clear-screen=false'];
  try {
    const child = spawn(
      process.execPath,
      [...(isWatching ? watching : ['--import', 'tsx']), 'server/main.ts'],
      {
        cwd: ROOT,
        env: { ...process.env, ...cacheEnv(), ...env },
        detached: true,
        stdio: ['ignore', isWatching ? 'inherit' : log, isWatching ? 'inherit' : log],
      },
    );
    child.on('error', () => undefined);
    if (child.pid !== undefined) recordProcess(SERVER_RECORD, child.pid);
    return child;
  } finally {
    closeSync(log);
  }
}

/** Lets the server finish what it is answering, then ends its whole group. @param {ChildProcess} child */
export async function endServer(child) {
  await endChild(child, ['SIGTERM', 'SIGKILL']);
  signalGroup(child.pid, 'SIGKILL');
  forgetProcess(SERVER_RECORD);
}

/**
 * Resolves with true once /api/health says ok; false when time is up or the wait is called off.
 * @param {() => number} getPort asked anew each time
 * @param {{patienceMs: number, isOver: () => boolean, isOurs?: () => boolean}} options isOurs: whether it is our server
 *   that listens there
 */
export async function waitForHealth(getPort, { patienceMs, isOver, isOurs = () => true }) {
  const deadline = Date.now() + patienceMs;
  while (Date.now() < deadline && !isOver()) {
    if (isOurs() && (await isHealthy(getPort()))) return true;
    await sleep(100);
  }
  return false;
}

/** @param {number} port */
async function isHealthy(port) {
  try {
    const response = await fetch(`http://${HEALTH_HOST}:${port}/api/health`, {
      signal: AbortSignal.timeout(2_000),
    });
    const health = await response.json();
    return response.ok && health.status === 'ok';
  } catch {
    return false;
  }
}

/** The end of the server's log, for a failure that has to be explained. */
export function lastServerLines() {
  try {
    return readFileSync(LOG, 'utf8').trim().split('\n').slice(-15).join('\n');
  } catch {
    return '';
  }
}
