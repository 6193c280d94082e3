import { chmodSync, existsSync, mkdirSync, renameSync, rmSync } from 'node:fs';
import path from 'node:path';
import {
  clusterRecord,
  launchCluster,
  prepareCluster,
  stopCluster,
  stopLeftoverCluster,
} from './cluster.mjs';
import { adminEnv, ensureRoles } from './databases.mjs';
import { BACKUP_FOLDER, DATA_FOLDER, RUN_FOLDER } from './paths.mjs';
import { findRecordedProcess, forgetProcess, recordProcess } from './process-record.mjs';
import { runProgram } from './run-program.mjs';
import { Remedy } from './say.mjs';

/** @typedef {import('./cluster.mjs').Cluster} Cluster */

/** Written by npm start while it runs; its note is the address. */
export const START_RECORD = path.join(RUN_FOLDER, 'start.json');

/**
 * Dumps a database in pg_dump's custom format; the file has its name only when it is complete.
 * @param {Cluster} cluster
 * @param {string} database
 * @returns {Promise<string>} the file
 */
export async function dumpDatabase(cluster, database) {
  mkdirSync(BACKUP_FOLDER, { recursive: true, mode: 0o700 });
  const moment = new Date().toISOString().replace(/[:.]/g, '-');
  const file = path.join(BACKUP_FOLDER, `${database}-${moment}.dump`);
  const unfinished = `${file}.part`;
  try {
    await runProgram(path.join(cluster.programs, 'pg_dump'), ['-Fc', '-d', database, '-f', unfinished], {
      env: adminEnv(cluster),
    });
    chmodSync(unfinished, 0o600);
    renameSync(unfinished, file);
  } finally {
    rmSync(unfinished, { force: true });
  }
  return file;
}

/** For scripts that work on data that exist. */
export function requireData() {
  if (!existsSync(path.join(DATA_FOLDER, 'cluster.json'))) {
    throw new Remedy('There are no data yet: npm start makes them.');
  }
}

/** For scripts that replace the database. */
export function requireStopped() {
  const start = findRecordedProcess(START_RECORD);
  if (start)
    throw new Remedy(
      `Larderline is running (process ${start.pid}). Stop it with Ctrl-C first, then run this again.`,
    );
}

/**
 * Runs work against the cluster of npm start, or starts the cluster for the work alone.
 * @param {(cluster: Cluster) => Promise<void>} work
 */
export async function withCluster(work) {
  const cluster = await prepareCluster({ home: DATA_FOLDER, isDurable: true });
  const other = findRecordedProcess(START_RECORD);
  if (other && findRecordedProcess(clusterRecord(cluster))) return work(cluster);
  if (other) throw new Remedy(`Process ${other.pid} works on these data just now. Wait until it is done.`);
  // The same record that npm start writes: neither it nor another script may take the cluster away meanwhile.
  recordProcess(START_RECORD, process.pid);
  await stopLeftoverCluster(cluster);
  const child = await launchCluster(cluster);
  const stop = () =>
    void stopCluster(cluster, child).then(() => {
      forgetProcess(START_RECORD);
      process.exit(130);
    });
  process.once('SIGINT', stop).once('SIGTERM', stop);
  try {
    await ensureRoles(cluster);
    await work(cluster);
  } finally {
    await stopCluster(cluster, child);
    forgetProcess(START_RECORD);
    process.off('SIGINT', stop).off('SIGTERM', stop);
  }
}
