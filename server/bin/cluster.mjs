import { spawn } from 'node:child_process';
import { randomBytes } from 'node:crypto';
import {
  chownSync,
  closeSync,
  existsSync,
  mkdirSync,
  openSync,
  readFileSync,
  readlinkSync,
  renameSync,
  rmSync,
  statSync,
  truncateSync,
  writeFileSync,
} from 'node:fs';
import path from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';
import { clusterAccount, isReachable, makeOwnFolder } from './cluster-account.mjs';
import { programFolder } from './cluster-programs.mjs';
import { findFreePort, isPortFree } from './free-port.mjs';
import { shortHash } from './paths.mjs';
import { endRecordedProcess, forgetProcess, recordProcess } from './process-record.mjs';
import { runProgram, tryProgram } from './run-program.mjs';
import { Remedy } from './say.mjs';

/**
 * One PostgreSQL cluster of our own: loopback only, a free port, no socket file, passwords in a file that only the
 * owner may read. The system's own cluster is never touched.
 * @typedef {object} Cluster
 * @property {string} home where cluster.json, the log and the process record are
 * @property {string} folder PostgreSQL's data folder
 * @property {string} programs folder of initdb, postgres, psql, pg_dump
 * @property {{postgres: string, larderline_owner: string, larderline_app: string}} passwords
 * @property {boolean} isDurable false for tests: a power cut may lose everything
 * @property {number} port 0 until launched
 */

/** @typedef {import('node:child_process').ChildProcess} ChildProcess */

const MOST_LOG_BYTES = 10_000_000;

/**
 * Makes the cluster when there is none yet; starts nothing that stays.
 * @param {{home: string, isDurable: boolean}} options
 * @returns {Promise<Cluster>}
 */
export async function prepareCluster({ home, isDurable }) {
  mkdirSync(home, { recursive: true });
  const account = clusterAccount();
  const identity = readOrMakeIdentity(home, account);
  const cluster = {
    home,
    folder: identity.folder,
    programs: programFolder(identity.folder),
    passwords: identity.passwords,
    isDurable,
    port: identity.port ?? 0,
  };
  if (!existsSync(path.join(cluster.folder, 'PG_VERSION'))) await initialise(cluster, account);
  return cluster;
}

/**
 * @param {string} home
 * @param {import('./cluster-account.mjs').ClusterAccount} account
 * @returns {{folder: string, passwords: Cluster['passwords'], port?: number}}
 */
function readOrMakeIdentity(home, account) {
  const file = path.join(home, 'cluster.json');
  if (existsSync(file)) return JSON.parse(readFileSync(file, 'utf8'));

  const inHome = path.join(home, 'postgres');
  if (existsSync(path.join(inHome, 'PG_VERSION'))) {
    throw new Remedy(
      `${inHome} holds data, but ${file} with its passwords is gone. Put the file back, or move the folder away.`,
    );
  }
  const secret = () => randomBytes(24).toString('hex');
  const identity = {
    folder: isReachable(home, account) ? inHome : outsideFolder(home),
    passwords: { postgres: secret(), larderline_owner: secret(), larderline_app: secret() },
  };
  writeFileSync(file, JSON.stringify(identity), { mode: 0o600 });
  return identity;
}

/** A place the postgres user can reach, new for every new home even at the same path. @param {string} home */
function outsideFolder(home) {
  const parent = '/var/lib/larderline';
  mkdirSync(parent, { recursive: true, mode: 0o755 });
  return path.join(parent, `${shortHash(home)}-${randomBytes(4).toString('hex')}`);
}

/**
 * Made under another name and then renamed, so that a broken initdb is never taken for a cluster.
 * @param {Cluster} cluster
 * @param {import('./cluster-account.mjs').ClusterAccount} account
 */
async function initialise(cluster, account) {
  const unfinished = `${cluster.folder}.new`;
  const passwordFile = `${cluster.folder}.password`;
  rmSync(unfinished, { recursive: true, force: true });
  makeOwnFolder(unfinished, account);
  try {
    writeFileSync(passwordFile, cluster.passwords.postgres, { mode: 0o600 });
    if (account.uid !== undefined && account.gid !== undefined)
      chownSync(passwordFile, account.uid, account.gid);
    const args = [
      '-D',
      unfinished,
      '-U',
      'postgres',
      '-E',
      'UTF8',
      '--locale=C.UTF-8',
      '-A',
      'scram-sha-256',
    ];
    const sync = cluster.isDurable ? [] : ['--no-sync'];
    await runProgram(path.join(cluster.programs, 'initdb'), [...args, `--pwfile=${passwordFile}`, ...sync], {
      ...account,
      cwd: '/',
    });
    renameSync(unfinished, cluster.folder);
  } finally {
    rmSync(passwordFile, { force: true });
    rmSync(unfinished, { recursive: true, force: true });
  }
}

/** @param {Cluster} cluster */
export function clusterRecord(cluster) {
  return path.join(cluster.home, 'run', 'postgres.json');
}

/**
 * Starts PostgreSQL in the foreground of a process group of its own and waits until it answers. The last port is
 * taken again when it is free. After a power cut PostgreSQL recovers by itself.
 * @param {Cluster} cluster its port is set
 * @returns {Promise<ChildProcess>}
 */
export async function launchCluster(cluster) {
  removeStalePidFile(cluster.folder);
  for (let attempt = 1; ; attempt += 1) {
    if (cluster.port === 0 || !(await isPortFree(cluster.port))) cluster.port = await findFreePort();
    const child = spawnPostgres(cluster);
    if (await waitUntilItAnswers(cluster, child)) {
      rememberPort(cluster);
      return child;
    }
    await stopCluster(cluster, child);
    if (attempt === 4) throw new Remedy(`PostgreSQL does not start. Its log: ${logFile(cluster)}`);
    // Children of a killed server may still hold its shared memory for a moment, or the port was just taken.
    await sleep(500 * attempt);
  }
}

/** @param {Cluster} cluster @returns {ChildProcess} */
function spawnPostgres(cluster) {
  const settings = [
    'listen_addresses=127.0.0.1',
    'unix_socket_directories=',
    'max_connections=100',
    'shared_buffers=64MB',
    'timezone=UTC',
    'log_timezone=UTC',
    'password_encryption=scram-sha-256',
    ...(cluster.isDurable ? [] : ['fsync=off', 'synchronous_commit=off', 'full_page_writes=off']),
  ];
  const args = [
    '-D',
    cluster.folder,
    '-p',
    String(cluster.port),
    ...settings.flatMap((setting) => ['-c', setting]),
  ];
  const log = openLog(cluster);
  try {
    const child = spawn(path.join(cluster.programs, 'postgres'), args, {
      ...clusterAccount(),
      cwd: '/',
      detached: true,
      stdio: ['ignore', log, log],
    });
    child.on('error', () => undefined);
    if (child.pid !== undefined) recordProcess(clusterRecord(cluster), child.pid);
    return child;
  } finally {
    closeSync(log);
  }
}

/** @param {Cluster} cluster @param {ChildProcess} child */
async function waitUntilItAnswers(cluster, child) {
  const isReady = path.join(cluster.programs, 'pg_isready');
  const deadline = Date.now() + 120_000;
  while (Date.now() < deadline && hasNotEnded(child)) {
    const answer = await tryProgram(isReady, ['-q', '-h', '127.0.0.1', '-p', String(cluster.port)]);
    // Somebody else's server may answer on a port that was snatched: ours must still be alive a moment later.
    if (answer.code === 0) {
      await sleep(30);
      return hasNotEnded(child);
    }
    await sleep(60);
  }
  return false;
}

/** @param {ChildProcess} child */
function hasNotEnded(child) {
  return child.pid !== undefined && child.exitCode === null && child.signalCode === null;
}

/**
 * Fast shutdown: open transactions are rolled back, everything committed is on disk.
 * @param {Cluster} cluster
 * @param {ChildProcess} child
 */
export async function stopCluster(cluster, child) {
  await endChild(child, ['SIGINT', 'SIGQUIT', 'SIGKILL']);
  forgetProcess(clusterRecord(cluster));
}

/** Ends a PostgreSQL that an earlier, killed start left behind. @param {Cluster} cluster */
export function stopLeftoverCluster(cluster) {
  return endRecordedProcess(clusterRecord(cluster), { politeSignal: 'SIGINT', patienceMs: 20_000 });
}

/** @param {ChildProcess} child @param {NodeJS.Signals[]} signals each gets 15 s */
export async function endChild(child, signals) {
  for (const name of signals) {
    if (!hasNotEnded(child)) return;
    child.kill(name);
    const deadline = Date.now() + 15_000;
    while (hasNotEnded(child) && Date.now() < deadline) await sleep(25);
  }
}

/**
 * postmaster.pid survives a power cut. PostgreSQL clears it by itself unless its number belongs to another process
 * of the same user by now; only then do we.
 * @param {string} folder
 */
function removeStalePidFile(folder) {
  const file = path.join(folder, 'postmaster.pid');
  if (!existsSync(file)) return;
  const pid = Number.parseInt(readFileSync(file, 'utf8'), 10);
  try {
    if (path.basename(readlinkSync(`/proc/${pid}/exe`)) !== 'postgres') rmSync(file);
  } catch {
    // No such process: PostgreSQL sees that too.
  }
}

/** @param {Cluster} cluster */
function rememberPort(cluster) {
  const identity = { folder: cluster.folder, passwords: cluster.passwords, port: cluster.port };
  const file = path.join(cluster.home, 'cluster.json');
  writeFileSync(`${file}.new`, JSON.stringify(identity), { mode: 0o600 });
  renameSync(`${file}.new`, file);
}

/** @param {Cluster} cluster */
function logFile(cluster) {
  return path.join(cluster.home, 'logs', 'postgres.log');
}

/** @param {Cluster} cluster */
function openLog(cluster) {
  const file = logFile(cluster);
  mkdirSync(path.dirname(file), { recursive: true });
  if (existsSync(file) && statSync(file).size > MOST_LOG_BYTES) truncateSync(file);
  return openSync(file, 'a');
}

/** Removes a cluster for good, wherever it lies. @param {Cluster} cluster */
export function destroyCluster(cluster) {
  rmSync(cluster.folder, { recursive: true, force: true });
  rmSync(cluster.home, { recursive: true, force: true });
}
