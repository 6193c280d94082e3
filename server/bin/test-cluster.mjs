import { existsSync, readdirSync, rmSync } from 'node:fs';
import path from 'node:path';
import {
  destroyCluster,
  launchCluster,
  prepareCluster,
  stopCluster,
  stopLeftoverCluster,
} from './cluster.mjs';
import { createDatabase, databaseEnv, ensureRoles } from './databases.mjs';
import { TEST_FOLDER } from './paths.mjs';
import { findRecordedProcess, recordProcess } from './process-record.mjs';
import { runTypeScript } from './run-program.mjs';

/** Migrated once per run; every test file's database is a copy of it. */
export const TEMPLATE_DATABASE = 'larderline_template';

/**
 * A cluster for one test run, in a folder that names the run, gone afterwards. Demo data are never near it.
 * @returns {Promise<{cluster: import('./cluster.mjs').Cluster, close: () => Promise<void>}>}
 */
export async function openTestCluster() {
  await removeAbandonedClusters();
  const home = path.join(TEST_FOLDER, `run-${process.pid}`);
  const cluster = await prepareCluster({ home, isDurable: false });
  recordProcess(ownerRecord(home), process.pid);
  const child = await launchCluster(cluster);
  const close = async () => {
    process.off('exit', endAtOnce);
    await stopCluster(cluster, child);
    destroyCluster(cluster);
  };
  // For an exit that waits for nobody, such as a second Ctrl-C.
  const endAtOnce = () => child.kill('SIGQUIT');
  process.once('exit', endAtOnce);
  try {
    await ensureRoles(cluster);
    await createDatabase(cluster, TEMPLATE_DATABASE);
    await runTypeScript('server/bin/migrate.ts', { env: databaseEnv(cluster, TEMPLATE_DATABASE) });
  } catch (error) {
    await close();
    throw error;
  }
  return { cluster, close };
}

/**
 * The cluster that `npm test` has started for the whole run, or one of our own.
 * @returns {Promise<{home: string, close: () => Promise<void>}>}
 */
export async function takeOrOpenTestCluster() {
  const home = process.env.TEST_CLUSTER_HOME;
  if (home) return { home, close: async () => undefined };
  const { cluster, close } = await openTestCluster();
  return { home: cluster.home, close };
}

/** @param {string} home */
function ownerRecord(home) {
  return path.join(home, 'owner.json');
}

/** Runs that were killed leave their cluster; the next run clears it away. */
async function removeAbandonedClusters() {
  if (!existsSync(TEST_FOLDER)) return;
  for (const name of readdirSync(TEST_FOLDER)) {
    const home = path.join(TEST_FOLDER, name);
    const isBeingMade =
      name.startsWith('run-') && !existsSync(ownerRecord(home)) && isAlive(Number(name.slice(4)));
    if (isBeingMade || findRecordedProcess(ownerRecord(home))) continue;
    if (existsSync(path.join(home, 'cluster.json'))) {
      const cluster = await prepareCluster({ home, isDurable: false });
      await stopLeftoverCluster(cluster);
      destroyCluster(cluster);
    }
    rmSync(home, { recursive: true, force: true });
  }
}

/** @param {number} pid */
function isAlive(pid) {
  return existsSync(`/proc/${pid}`);
}
