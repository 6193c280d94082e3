import { migrateDatabase } from '../db/migrate';
import { readEnv } from '../env';

/** Brings the schema up to date as the owner role; does nothing when it is. */
async function main() {
  const { databaseOwnerUrl } = readEnv();
  if (databaseOwnerUrl === undefined) throw new Error('DATABASE_OWNER_URL: migrations need the owner role.');
  await migrateDatabase(databaseOwnerUrl);
}

main().catch((error: unknown) => {
  process.stderr.write(`${error instanceof Error ? (error.stack ?? error.message) : String(error)}\n`);
  process.exitCode = 1;
});
