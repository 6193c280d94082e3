import { mkdirSync } from 'node:fs';
import path from 'node:path';
import { START_RECORD } from './backup-file.mjs';
import { launchCluster, prepareCluster, stopCluster, stopLeftoverCluster } from './cluster.mjs';
import { DATABASE, createDatabase, databaseEnv, ensureRoles, hasDatabase } from './databases.mjs';
import { ensureDebianPackages } from './debian-packages.mjs';
import { bringUpToDate } from './migrations.mjs';
import { checkNode, ensureNodeModules } from './node-modules.mjs';
import { DATA_FOLDER, ROOT } from './paths.mjs';
import { endRecordedProcess, findRecordedProcess, forgetProcess, recordProcess } from './process-record.mjs';
import { rebuildOnChange } from './rebuild-on-change.mjs';
import { PACKAGES_TO_RUN } from './required-packages.mjs';
import { runTypeScript } from './run-program.mjs';
import { Remedy, runScript, say } from './say.mjs';
import { SERVER_RECORD } from './server-process.mjs';
import { listenForStopRequest } from './stop-request.mjs';
import { supervise } from './supervise.mjs';
import { superviseServer } from './supervised-server.mjs';
import { ensureWebBuild } from './web-build.mjs';

const isDev = process.argv.includes('--dev');
const isDemo = (process.env.APP_MODE || 'demo') === 'demo';
const stopRequest = listenForStopRequest();
/** What has been started, to be stopped in the opposite order. @type {(() => void | Promise<void>)[]} */
const closers = [];
/** Set once there is a server. */
let restartServer = () => /** @type {boolean | undefined} */ (undefined);

await runScript(async () => {
  try {
    await start();
  } catch (error) {
    // A step that the stop request cut short is no failure.
    if (!stopRequest.isMade) throw error;
  } finally {
    if (closers.length > 0) say('Stopping …');
    for (const close of closers.reverse()) await close();
  }
  if (stopRequest.isMade) say('Stopped. The data stay.');
});

async function start() {
  refuseSecondStart();
  checkNode();
  mkdirSync(DATA_FOLDER, { recursive: true });
  recordProcess(START_RECORD, process.pid);
  closers.push(() => forgetProcess(START_RECORD));

  await step(() => ensureDebianPackages(PACKAGES_TO_RUN));
  await step(ensureNodeModules);
  const { cluster, supervised: postgres } = await step(startPostgres);
  await step(() => prepareDatabase(cluster));
  await step(ensureWebBuild);
  const server = await step(() => startServer(cluster));
  if (isDev) closers.push(rebuildOnChange());
  await Promise.race([stopRequest.made, postgres.failed, server.failed]);
}

/**
 * Runs one step unless a stop was asked for meanwhile.
 * @template Result
 * @param {() => Result | Promise<Result>} run
 * @returns {Promise<Result>}
 */
async function step(run) {
  if (stopRequest.isMade) throw new Remedy('Stopped before it was ready.');
  return run();
}

function refuseSecondStart() {
  const other = findRecordedProcess(START_RECORD);
  if (other) {
    const address = other.note ? ` at ${other.note}` : '';
    throw new Remedy(
      `Larderline already runs from this folder${address} (process ${other.pid}). Stop it there with Ctrl-C.`,
    );
  }
}

async function startPostgres() {
  const cluster = await prepareCluster({ home: DATA_FOLDER, isDurable: true });
  if (await endRecordedProcess(SERVER_RECORD, { politeSignal: 'SIGTERM', patienceMs: 10_000 })) {
    say('Ended a server that an earlier start had left behind.');
  }
  if (await stopLeftoverCluster(cluster)) say('Ended a PostgreSQL that an earlier start had left behind.');
  const supervised = await supervise({
    name: 'PostgreSQL',
    launch: async () => {
      const lastPort = cluster.port;
      const child = await launchCluster(cluster);
      // Only when another program snatched the port: the server then has to learn the new one.
      if (cluster.port !== lastPort) restartServer();
      return child;
    },
    end: (child) => stopCluster(cluster, child),
    onRelaunched: () => say('PostgreSQL runs again.'),
  });
  closers.push(supervised.stop);
  say(`PostgreSQL runs on 127.0.0.1:${cluster.port}, data in ${shown(cluster.folder)}`);
  return { cluster, supervised };
}

/** @param {import('./cluster.mjs').Cluster} cluster */
async function prepareDatabase(cluster) {
  await ensureRoles(cluster);
  if (!(await hasDatabase(cluster, DATABASE))) await createDatabase(cluster, DATABASE);
  await bringUpToDate(cluster, DATABASE);
  say('The database schema is up to date.');
  if (!isDemo) return;
  const answer = await runTypeScript('server/bin/seed.ts', { env: databaseEnv(cluster, DATABASE) });
  if (answer.trim() !== '') say(answer.trim());
}

/** @param {import('./cluster.mjs').Cluster} cluster */
async function startServer(cluster) {
  const server = await superviseServer(cluster, { isWatching: isDev, isStopping: () => stopRequest.isMade });
  closers.push(server.stop);
  restartServer = server.restart;
  const address = await server.waitForFirstAnswer();
  if (!stopRequest.isMade) {
    recordProcess(START_RECORD, process.pid, address);
    say(`Larderline is ready at ${address}`);
    if (isDemo) say('Demo people and their passwords: npm run -s demo:people. Ctrl-C stops everything.');
  }
  return server;
}

/** @param {string} place */
function shown(place) {
  const relative = path.relative(ROOT, place);
  return relative.startsWith('..') ? place : relative;
}
