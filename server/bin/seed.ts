import { openDatabase } from '../db/client';
import { readEnv } from '../env';
import { engineWorkers } from '../jobs/engine-workers';
import { seedDemo } from '../modules/demo/seed-demo';

/** Fills an empty database with the demo account; says so only when it did. */
async function main() {
  const env = readEnv();
  const { db, close } = openDatabase(env.databaseUrl);
  const engine = engineWorkers({ threads: env.workerThreads });
  try {
    if (await seedDemo({ db, engine })) process.stdout.write('The demo account is ready.\n');
  } finally {
    await Promise.all([engine.stop(), close()]);
  }
}

main().catch((error: unknown) => {
  process.stderr.write(`The demo account was not made; nothing of it stays.\n`);
  process.stderr.write(`${error instanceof Error ? (error.stack ?? error.message) : String(error)}\n`);
  process.exitCode = 1;
});
