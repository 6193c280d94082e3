import { spawn } from 'node:child_process';
import { mkdirSync } from 'node:fs';
import { CACHE_FOLDER, ROOT } from './paths.mjs';
import { Remedy } from './say.mjs';

/** Programs that run now, so that a stop signal can end them too. @type {Set<import('node:child_process').ChildProcess>} */
const running = new Set();

/**
 * @typedef {object} ProgramOptions
 * @property {Record<string, string | undefined>} [env] added to this process's own
 * @property {string} [input] written to standard input
 * @property {boolean} [isShown] its output goes to ours; otherwise it is collected
 * @property {number} [uid]
 * @property {number} [gid]
 * @property {string} [cwd]
 */

/**
 * Runs a program to its end in a process group of its own. Resolves with its output; rejects with its last lines
 * when it ends with anything but code 0.
 * @param {string} program
 * @param {string[]} args
 * @param {ProgramOptions} [options]
 * @returns {Promise<string>}
 */
export async function runProgram(program, args, options = {}) {
  const outcome = await tryProgram(program, args, options);
  if (outcome.code === 0) return outcome.output;
  const ending = outcome.signal ? `was ended by ${outcome.signal}` : `ended with code ${outcome.code}`;
  const lastLines = (outcome.output + outcome.errors).trim().split('\n').slice(-40).join('\n');
  throw new Remedy(`${program} ${args.slice(0, 4).join(' ')} ${ending}.\n${lastLines}`);
}

/**
 * As runProgram, but the ending is data.
 * @param {string} program
 * @param {string[]} args
 * @param {ProgramOptions} [options]
 * @returns {Promise<{code: number | null, signal: string | null, output: string, errors: string}>}
 */
export function tryProgram(program, args, options = {}) {
  return new Promise((resolve, reject) => {
    const child = spawn(program, args, {
      cwd: options.cwd ?? ROOT,
      env: { ...process.env, ...options.env },
      uid: options.uid,
      gid: options.gid,
      detached: true,
      stdio: [
        options.input === undefined ? 'ignore' : 'pipe',
        options.isShown ? 'inherit' : 'pipe',
        options.isShown ? 'inherit' : 'pipe',
      ],
    });
    running.add(child);
    let output = '';
    let errors = '';
    child.stdout?.on('data', (chunk) => (output += chunk));
    child.stderr?.on('data', (chunk) => (errors += chunk));
    child.on('error', (error) => {
      running.delete(child);
      reject(new Remedy(`${program} could not be started: ${error.message}.`));
    });
    child.on('close', (code, signal) => {
      running.delete(child);
      resolve({ code, signal, output, errors });
    });
    child.stdin?.on('error', () => undefined);
    child.stdin?.end(options.input);
  });
}

/** Ends what runProgram still waits for. */
export function endRunningPrograms() {
  for (const child of running) signalGroup(child.pid, 'SIGTERM');
}

/**
 * Signals a whole process group; false when it is gone already.
 * @param {number | undefined} groupId
 * @param {NodeJS.Signals} signal
 */
export function signalGroup(groupId, signal) {
  if (groupId === undefined) return false;
  try {
    process.kill(-groupId, signal);
    return true;
  } catch {
    return false;
  }
}

/** Keeps the caches of tsx and Metro in the data folder. @returns {Record<string, string | undefined>} */
export function cacheEnv() {
  mkdirSync(CACHE_FOLDER, { recursive: true });
  return { TMPDIR: CACHE_FOLDER };
}

/**
 * Runs a TypeScript script through tsx.
 * @param {string} script path from the project's folder
 * @param {{args?: string[], env?: Record<string, string | undefined>, isShown?: boolean}} [options]
 */
export function runTypeScript(script, options = {}) {
  return runProgram(process.execPath, ['--import', 'tsx', script, ...(options.args ?? [])], {
    env: { ...cacheEnv(), ...options.env },
    isShown: options.isShown,
  });
}
