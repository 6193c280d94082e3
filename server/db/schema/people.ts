import { sql } from 'drizzle-orm';
import { check, index, pgTable, text, uniqueIndex, uuid } from 'drizzle-orm/pg-core';
import { createdAt, id, instant } from './columns';

export const users = pgTable(
  'users',
  {
    id: id(),
    /** argon2id, with its parameters and salt inside. */
    passwordHash: text('password_hash').notNull(),
    unitSystem: text('unit_system', { enum: ['metric', 'us_customary'] })
      .notNull()
      .default('metric'),
    createdAt: createdAt(),
  },
  (table) => [check('users_unit_system', sql`${table.unitSystem} IN ('metric', 'us_customary')`)],
);

/** The one erasable table: what names a person. Everything else refers to users by id alone. */
export const people = pgTable(
  'people',
  {
    userId: uuid('user_id')
      .primaryKey()
      .references(() => users.id),
    name: text('name').notNull(),
    email: text('email').notNull(),
  },
  (table) => [uniqueIndex('people_email').on(sql`lower(${table.email})`)],
);

export const sessions = pgTable(
  'sessions',
  {
    /** SHA-256 of what the cookie holds, hex: a dump opens no session. */
    id: text('id').primaryKey(),
    userId: uuid('user_id')
      .notNull()
      .references(() => users.id),
    expiresAt: instant('expires_at').notNull(),
  },
  (table) => [index('sessions_of_user').on(table.userId)],
);

/** One row per try and subject (an e-mail address or a network address, as SHA-256); old rows are purged. */
export const attempts = pgTable(
  'attempts',
  {
    id: id(),
    kind: text('kind', { enum: ['sign_in', 'password_reset'] }).notNull(),
    subjectSha256: text('subject_sha256').notNull(),
    at: instant('at').notNull().defaultNow(),
  },
  (table) => [index('attempts_by_subject').on(table.kind, table.subjectSha256, table.at)],
);

export const passwordResetTokens = pgTable(
  'password_reset_tokens',
  {
    tokenSha256: text('token_sha256').primaryKey(),
    userId: uuid('user_id')
      .notNull()
      .references(() => users.id),
    expiresAt: instant('expires_at').notNull(),
    createdAt: createdAt(),
  },
  (table) => [index('password_reset_tokens_of_user').on(table.userId)],
);
