import { sql } from 'drizzle-orm';
import { check, foreignKey, index, pgTable, primaryKey, text, unique, uuid } from 'drizzle-orm/pg-core';
import { createdAt, id } from './columns';
import { users } from './people';

export const accounts = pgTable(
  'accounts',
  {
    id: id(),
    slug: text('slug').notNull(),
    name: text('name').notNull(),
    /** ISO 4217. */
    currency: text('currency').notNull(),
    /** IANA name; due dates are dates of this zone. */
    timeZone: text('time_zone').notNull(),
    createdAt: createdAt(),
  },
  (table) => [
    unique('accounts_slug').on(table.slug),
    check('accounts_slug_form', sql`${table.slug} ~ '^[a-z0-9]([a-z0-9-]{0,60}[a-z0-9])?$'`),
    check('accounts_currency_form', sql`${table.currency} ~ '^[A-Z]{3}$'`),
  ],
);

/** A supplier or a client of one account. */
export const companies = pgTable(
  'companies',
  {
    id: id(),
    accountId: uuid('account_id')
      .notNull()
      .references(() => accounts.id),
    name: text('name').notNull(),
    createdAt: createdAt(),
  },
  (table) => [unique('companies_of_account').on(table.accountId, table.id)],
);

/** A subset of {engineer, admin}, or exactly one guest role with a company of the same account. */
export const memberships = pgTable(
  'memberships',
  {
    accountId: uuid('account_id')
      .notNull()
      .references(() => accounts.id),
    userId: uuid('user_id')
      .notNull()
      .references(() => users.id),
    roles: text('roles').array().notNull(),
    companyId: uuid('company_id'),
    createdAt: createdAt(),
  },
  (table) => [
    primaryKey({ columns: [table.accountId, table.userId] }),
    index('memberships_of_user').on(table.userId),
    foreignKey({
      name: 'memberships_company_of_account',
      columns: [table.accountId, table.companyId],
      foreignColumns: [companies.accountId, companies.id],
    }),
    check(
      'memberships_seat_or_guest',
      sql`(${table.companyId} IS NULL AND ${table.roles} IN (ARRAY['engineer'], ARRAY['admin'], ARRAY['engineer', 'admin']))
        OR (${table.companyId} IS NOT NULL AND ${table.roles} IN (ARRAY['supplier'], ARRAY['client']))`,
    ),
  ],
);
