import { existsSync } from 'node:fs';
import path from 'node:path';
import { dumpDatabase, requireStopped, withCluster } from './backup-file.mjs';
import {
  DATABASE,
  adminEnv,
  createDatabase,
  databaseEnv,
  dropDatabase,
  hasDatabase,
  runSql,
} from './databases.mjs';
import { countAppliedMigrations, countKnownMigrations } from './migrations.mjs';
import { checkNode, ensureNodeModules } from './node-modules.mjs';
import { runProgram, runTypeScript } from './run-program.mjs';
import { Remedy, runScript, say } from './say.mjs';

/** Restored here first, so that a broken file leaves the data as they are. */
const ARRIVING = `${DATABASE}_arriving`;
/** The data from before keep existing until the new ones stand in their place. */
const BEFORE = `${DATABASE}_before`;

await runScript(async () => {
  const file = process.argv[2];
  if (!file) throw new Remedy('Name the file: npm run restore -- .data/backups/….dump');
  if (!existsSync(file)) throw new Remedy(`There is no file ${file}.`);
  checkNode();
  requireStopped();
  await ensureNodeModules();
  await withCluster(async (cluster) => {
    await dropDatabase(cluster, ARRIVING);
    await createDatabase(cluster, ARRIVING);
    try {
      await fill(cluster, path.resolve(file));
    } catch (error) {
      await dropDatabase(cluster, ARRIVING);
      throw error;
    }
    if (await hasDatabase(cluster, DATABASE)) {
      say(`The data from before are in ${await dumpDatabase(cluster, DATABASE)}`);
      await dropDatabase(cluster, BEFORE);
      await runSql(cluster, 'postgres', `ALTER DATABASE ${DATABASE} RENAME TO ${BEFORE}`);
    }
    await runSql(cluster, 'postgres', `ALTER DATABASE ${ARRIVING} RENAME TO ${DATABASE}`);
    await dropDatabase(cluster, BEFORE);
    say(`Restored ${file}. Go on with: npm start`);
  });
});

/**
 * @param {import('./cluster.mjs').Cluster} cluster
 * @param {string} file
 */
async function fill(cluster, file) {
  const args = ['--exit-on-error', '--single-transaction', '-d', ARRIVING, file];
  await runProgram(path.join(cluster.programs, 'pg_restore'), args, { env: adminEnv(cluster) });
  const applied = await countAppliedMigrations(cluster, ARRIVING);
  if (applied === 0) throw new Remedy(`${file} holds no Larderline data.`);
  if (applied > countKnownMigrations()) {
    throw new Remedy(`${file} was made by a newer Larderline. Restore it with that version.`);
  }
  await runTypeScript('server/bin/migrate.ts', { env: databaseEnv(cluster, ARRIVING) });
}
