import { spawn } from 'node:child_process';
import { closeSync, mkdirSync, openSync } from 'node:fs';
import path from 'node:path';
import { endChild } from '../../server/bin/cluster.mjs';
import { findFreePort } from '../../server/bin/free-port.mjs';
import { runTypeScript } from '../../server/bin/run-program.mjs';
import { waitForHealth } from '../../server/bin/server-process.mjs';
import { ROOT } from './source-files';
import { createTestDatabase, type TestDatabase } from './test-database';

export interface RunningProduct {
  /** Without a slash at the end. */
  address: string;
  database: TestDatabase;
  stop: () => Promise<void>;
}

const START_PATIENCE_MS = 60_000;

/** The real server as its own process over a fresh database with the demo data, serving the web build. */
export async function startProduct(): Promise<RunningProduct> {
  const database = await createTestDatabase();
  const port = await findFreePort();
  const env = {
    DATABASE_URL: database.url,
    DATABASE_OWNER_URL: database.ownerUrl,
    PORT: String(port),
    APP_MODE: 'demo',
    NODE_ENV: 'test',
  };
  await runTypeScript('server/bin/seed.ts', { env });
  const server = spawnServer(port, { ...env, DATABASE_OWNER_URL: undefined });
  const stop = async () => {
    await endChild(server, ['SIGTERM', 'SIGKILL']);
    await database.drop();
  };
  const isOver = () => server.exitCode !== null || server.signalCode !== null;
  if (!(await waitForHealth(() => port, { patienceMs: START_PATIENCE_MS, isOver }))) {
    await stop();
    throw new Error(`The server did not start; its log is ${logFile(port)}.`);
  }
  return { address: `http://127.0.0.1:${port}`, database, stop };
}

function logFile(port: number): string {
  return path.join(ROOT, 'test-results', 'logs', `server-${port}.log`);
}

/** In the test's own process group, so that whatever ends the run ends the server too. */
function spawnServer(port: number, env: NodeJS.ProcessEnv | Record<string, string | undefined>) {
  mkdirSync(path.dirname(logFile(port)), { recursive: true });
  const log = openSync(logFile(port), 'w');
  try {
    return spawn(process.execPath, ['--import', 'tsx', 'server/main.ts'], {
      cwd: ROOT,
      env: { ...process.env, ...env },
      stdio: ['ignore', log, log],
    });
  } finally {
    closeSync(log);
  }
}
