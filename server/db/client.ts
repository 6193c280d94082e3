import { drizzle, type PostgresJsDatabase } from 'drizzle-orm/postgres-js';
import postgres from 'postgres';
import * as schema from './schema';

export type Database = PostgresJsDatabase<typeof schema>;
/** A database or a transaction of it: what reads and writes take. */
export type Transaction = Parameters<Parameters<Database['transaction']>[0]>[0];
export type Queryable = Database | Transaction;

export interface DatabaseConnection {
  db: Database;
  /** The driver below drizzle; the job queue talks through it. */
  sql: postgres.Sql;
  close: () => Promise<void>;
}

const MOST_CONNECTIONS = 12;
const CONNECT_TIMEOUT_S = 3;
const STATEMENT_TIMEOUT_MS = 10_000;
const LOCK_TIMEOUT_MS = 8_000;
/** Longer than the longest computation inside a transaction (request deadline in server/http). */
const IDLE_IN_TRANSACTION_TIMEOUT_MS = 60_000;
const RECONNECT_PAUSE_S = 0.3;

/** Opens a pool. Connections are made when needed and made anew by themselves after the database was away. */
export function openDatabase(url: string): DatabaseConnection {
  const sql = postgres(url, {
    max: MOST_CONNECTIONS,
    connect_timeout: CONNECT_TIMEOUT_S,
    backoff: () => RECONNECT_PAUSE_S,
    onnotice: () => undefined,
    connection: {
      application_name: 'larderline',
      TimeZone: 'UTC',
      statement_timeout: STATEMENT_TIMEOUT_MS,
      lock_timeout: LOCK_TIMEOUT_MS,
      idle_in_transaction_session_timeout: IDLE_IN_TRANSACTION_TIMEOUT_MS,
    },
  });
  prepareStatements(sql);
  const db = drizzle(sql, { schema });
  return { db, sql, close: () => sql.end({ timeout: 2 }) };
}

/**
 * Drizzle hands its queries to `unsafe`, which asks the database to describe each one before it is run: two round trips
 * where a prepared statement takes one. Session and role are looked up at every request, so they are prepared.
 */
function prepareStatements(sql: postgres.Sql): void {
  const plain = sql.unsafe;
  sql.unsafe = ((query, parameters, options) =>
    plain(query, parameters, {
      ...options,
      prepare: options?.prepare ?? (parameters?.length ?? 0) > 0,
    })) as typeof sql.unsafe;
}
