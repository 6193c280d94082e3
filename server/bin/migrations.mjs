import { existsSync, readFileSync } from 'node:fs';
import { dumpDatabase } from './backup-file.mjs';
import { databaseEnv, runSql } from './databases.mjs';
import { inProject } from './paths.mjs';
import { runTypeScript } from './run-program.mjs';
import { say } from './say.mjs';

/** @typedef {import('./cluster.mjs').Cluster} Cluster */

/** Migrations in the folder drizzle. */
export function countKnownMigrations() {
  const journal = inProject('drizzle', 'meta', '_journal.json');
  if (!existsSync(journal)) return 0;
  return JSON.parse(readFileSync(journal, 'utf8')).entries.length;
}

/**
 * Migrations that a database has had; 0 for an empty one.
 * @param {Cluster} cluster
 * @param {string} database
 */
export async function countAppliedMigrations(cluster, database) {
  const table = 'drizzle.__drizzle_migrations';
  const found = await runSql(cluster, database, `SELECT to_regclass('${table}') IS NOT NULL`);
  return found === 't' ? Number(await runSql(cluster, database, `SELECT count(*) FROM ${table}`)) : 0;
}

/**
 * Brings the schema up to date; data that exist are dumped first.
 * @param {Cluster} cluster
 * @param {string} database
 */
export async function bringUpToDate(cluster, database) {
  const applied = await countAppliedMigrations(cluster, database);
  const pending = countKnownMigrations() - applied;
  if (applied > 0 && pending > 0) {
    say(`${pending} new migration(s); the data as they are now: ${await dumpDatabase(cluster, database)}`);
  }
  await runTypeScript('server/bin/migrate.ts', { env: databaseEnv(cluster, database) });
}
