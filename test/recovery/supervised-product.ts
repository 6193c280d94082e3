import { spawn, type ChildProcess } from 'node:child_process';
import { readFileSync } from 'node:fs';
import path from 'node:path';
import { setTimeout as sleep } from 'node:timers/promises';
import { destroyCluster, endChild, prepareCluster } from '../../server/bin/cluster.mjs';
import { findFreePort } from '../../server/bin/free-port.mjs';
import { waitForHealth } from '../../server/bin/server-process.mjs';
import { ROOT } from '../harness/source-files';

export type Victim = 'server' | 'postgres';

export interface SupervisedProduct {
  address: string;
  /** SIGKILL, as a power cut would: no process gets to say goodbye. */
  kill: (victim: Victim) => void;
  waitUntilHealthy: () => Promise<void>;
  stop: () => Promise<void>;
}

const START_PATIENCE_MS = 240_000;
const RECOVERY_PATIENCE_MS = 60_000;

/** `npm start` itself, on a data folder of its own that goes afterwards. */
export async function startSupervisedProduct(): Promise<SupervisedProduct> {
  const dataFolder = path.join(ROOT, '.data', `recovery-${process.pid}`);
  const port = await findFreePort();
  const launcher = spawn(process.execPath, ['server/bin/start.mjs'], {
    cwd: ROOT,
    env: {
      ...process.env,
      DATA_DIR: dataFolder,
      PORT: String(port),
      APP_MODE: 'demo',
      NODE_ENV: 'test',
      LOG_LEVEL: 'warn',
    },
    stdio: ['ignore', 'pipe', 'pipe'],
  });
  const stop = async () => {
    await endChild(launcher, ['SIGTERM', 'SIGTERM', 'SIGKILL']);
    destroyCluster(await prepareCluster({ home: dataFolder, isDurable: true }));
  };
  const address = await readAddress(launcher).catch(async (error: unknown) => {
    await stop();
    throw error;
  });
  return {
    address,
    kill: (victim) => {
      const record: unknown = JSON.parse(
        readFileSync(path.join(dataFolder, 'run', `${victim}.json`), 'utf8'),
      );
      process.kill((record as { pid: number }).pid, 'SIGKILL');
    },
    waitUntilHealthy: async () => {
      const isOver = () => launcher.exitCode !== null;
      const isHealthy = await waitForHealth(() => Number(new URL(address).port), {
        patienceMs: RECOVERY_PATIENCE_MS,
        isOver,
      });
      if (!isHealthy) throw new Error(`Not healthy ${RECOVERY_PATIENCE_MS / 1000} s after the kill.`);
    },
    stop,
  };
}

async function readAddress(launcher: ChildProcess): Promise<string> {
  let output = '';
  const collect = (chunk: Buffer) => (output += chunk.toString());
  launcher.stdout?.on('data', collect);
  launcher.stderr?.on('data', collect);
  const deadline = Date.now() + START_PATIENCE_MS;
  while (Date.now() < deadline && launcher.exitCode === null) {
    const address = /is ready at (http:\S+)/.exec(output)?.[1];
    if (address !== undefined) return address;
    await sleep(100);
  }
  throw new Error(`npm start did not get ready:\n${output}`);
}
