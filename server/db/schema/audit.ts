import { index, pgTable, text, uuid } from 'drizzle-orm/pg-core';
import { id, instant } from './columns';

/** Append-only: the application may insert and read, a trigger forbids the rest. No names, no foreign keys. */
export const auditLog = pgTable(
  'audit_log',
  {
    id: id(),
    at: instant('at').notNull().defaultNow(),
    /** Null where it belongs to no account, such as a sign-in. */
    accountId: uuid('account_id'),
    /** Null for the system. */
    actorUserId: uuid('actor_user_id'),
    action: text('action').notNull(),
    subjectKind: text('subject_kind').notNull(),
    subjectId: uuid('subject_id'),
  },
  (table) => [index('audit_log_of_account').on(table.accountId, table.id)],
);
