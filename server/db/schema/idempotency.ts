import { integer, pgTable, primaryKey, text, uuid } from 'drizzle-orm/pg-core';
import { createdAt } from './columns';
import { users } from './people';

/** A create that was answered once is answered the same again. Rows are purged after two days. */
export const idempotencyKeys = pgTable(
  'idempotency_keys',
  {
    userId: uuid('user_id')
      .notNull()
      .references(() => users.id),
    key: text('key').notNull(),
    /** SHA-256 of method, path and canonical body, hex. */
    requestSha256: text('request_sha256').notNull(),
    status: integer('status').notNull(),
    /** The response as it was sent; text, so that it stays byte for byte. */
    body: text('body').notNull(),
    etag: text('etag'),
    createdAt: createdAt(),
  },
  (table) => [primaryKey({ columns: [table.userId, table.key] })],
);
