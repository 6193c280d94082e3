import type { Sql } from 'postgres';

/** The schema that pg-boss has for itself. */
export const JOBS_SCHEMA = 'pgboss';

/** Every queue. Migrations create them as the owner, since the application role makes no tables. */
export const JOB_QUEUES = ['send-password-reset'] as const;
export type JobQueue = (typeof JOB_QUEUES)[number];

interface SqlExecutor {
  executeSql: (text: string, values?: unknown[]) => Promise<{ rows: Record<string, unknown>[] }>;
}

/** How pg-boss reaches the database through our own connections. Part of a transaction when `sql` is one. */
export function jobExecutor(sql: Pick<Sql, 'unsafe'> & { reserve?: Sql['reserve'] }): SqlExecutor {
  return {
    async executeSql(text, values) {
      if (values !== undefined && values.length > 0) {
        return { rows: [...(await sql.unsafe(text, values.map(asParameter)))] };
      }
      if (sql.reserve === undefined) return { rows: [...(await sql.unsafe(text))] };
      return { rows: await executeOnReserved(sql.reserve, text) };
    },
  };
}

/** Several statements in one text may open a transaction of their own: they need a connection to themselves. */
async function executeOnReserved(reserve: Sql['reserve'], text: string): Promise<Record<string, unknown>[]> {
  const connection = await reserve();
  try {
    return [...(await connection.unsafe(text))];
  } catch (error) {
    await connection.unsafe('ROLLBACK').catch(() => undefined);
    throw error;
  } finally {
    connection.release();
  }
}

/** drizzle has set the driver to pass JSON and times through as text, so they are made text here. */
function asParameter(value: unknown) {
  if (value === undefined || value === null) return null;
  if (value instanceof Date) return value.toISOString();
  if (Array.isArray(value)) return value.map(String);
  return typeof value === 'object' ? JSON.stringify(value) : String(value);
}
