import { customType, timestamp, uuid } from 'drizzle-orm/pg-core';

/** Bytes exactly as given. */
export const bytea = customType<{ data: Buffer; driverData: Buffer }>({ dataType: () => 'bytea' });

/** UUIDv7, made by the server (server/db/new-id.ts). */
export const id = () => uuid('id').primaryKey();

/** An instant, kept as UTC. */
export const instant = (name: string) => timestamp(name, { withTimezone: true, mode: 'date' });

export const createdAt = () => instant('created_at').notNull().defaultNow();
