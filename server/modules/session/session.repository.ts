import { eq, sql } from 'drizzle-orm';
import type { SessionResponse } from '../../../shared/contract/session';
import type { Queryable } from '../../db/client';
import { accounts, companies, memberships, people, users } from '../../db/schema';
import { isRole } from '../../http/find-memberships';

export async function findCredentials(db: Queryable, email: string) {
  const [row] = await db
    .select({ userId: users.id, passwordHash: users.passwordHash })
    .from(people)
    .innerJoin(users, eq(users.id, people.userId))
    .where(eq(sql`lower(${people.email})`, email.toLowerCase()));
  return row;
}

/** Who a user is and where they belong; undefined once erased. */
export async function findSessionOf(db: Queryable, userId: string): Promise<SessionResponse | undefined> {
  const [person] = await db
    .select({ name: people.name, email: people.email, unitSystem: users.unitSystem })
    .from(people)
    .innerJoin(users, eq(users.id, people.userId))
    .where(eq(people.userId, userId));
  if (!person) return undefined;
  const rows = await db
    .select({ membership: memberships, account: accounts, company: companies })
    .from(memberships)
    .innerJoin(accounts, eq(accounts.id, memberships.accountId))
    .leftJoin(companies, eq(companies.id, memberships.companyId))
    .where(eq(memberships.userId, userId))
    .orderBy(accounts.name);
  return {
    user: { id: userId, name: person.name, email: person.email, unit_system: person.unitSystem },
    memberships: rows.map(({ membership, account, company }) => ({
      account: { id: account.id, slug: account.slug, name: account.name, currency: account.currency },
      roles: membership.roles.filter(isRole),
      company: company && { id: company.id, name: company.name },
    })),
  };
}
