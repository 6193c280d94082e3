import { fileURLToPath } from 'node:url';
import { drizzle } from 'drizzle-orm/postgres-js';
import { migrate } from 'drizzle-orm/postgres-js/migrator';
import PgBoss from 'pg-boss';
import postgres from 'postgres';
import { JOBS_SCHEMA, JOB_QUEUES, jobExecutor } from './job-queues';

const MIGRATIONS_FOLDER = fileURLToPath(new URL('../../drizzle', import.meta.url));

/** Brings the schema and the job queues up to date, as the owner role. Does nothing when they are. */
export async function migrateDatabase(ownerUrl: string): Promise<void> {
  const sql = postgres(ownerUrl, { max: 2, onnotice: () => undefined, connect_timeout: 10 });
  try {
    await migrate(drizzle(sql), { migrationsFolder: MIGRATIONS_FOLDER });
    await migrateJobs(sql);
  } finally {
    await sql.end({ timeout: 5 });
  }
}

async function migrateJobs(sql: postgres.Sql) {
  const boss = new PgBoss({ db: jobExecutor(sql), schema: JOBS_SCHEMA, supervise: false, schedule: false });
  await boss.start();
  for (const queue of JOB_QUEUES) await boss.createQueue(queue);
  await boss.stop({ graceful: false });
  await sql.unsafe(`
    GRANT USAGE ON SCHEMA ${JOBS_SCHEMA} TO larderline_app;
    GRANT SELECT, INSERT, UPDATE, DELETE ON ALL TABLES IN SCHEMA ${JOBS_SCHEMA} TO larderline_app;
    GRANT EXECUTE ON ALL FUNCTIONS IN SCHEMA ${JOBS_SCHEMA} TO larderline_app;
  `);
}
