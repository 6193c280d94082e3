import type { Queryable } from '../client';
import { newId } from '../new-id';
import { accounts, companies, memberships, people, users } from '../schema';

/** Inserts one account; every value has a default. */
export async function insertAccount(
  db: Queryable,
  {
    slug = `account-${newId()}`,
    name = 'Test kitchen',
    currency = 'EUR',
    timeZone = 'Europe/Amsterdam',
  } = {},
): Promise<string> {
  const id = newId();
  await db.insert(accounts).values({ id, slug, name, currency, timeZone });
  return id;
}

export async function insertCompany(db: Queryable, accountId: string, name = 'A company'): Promise<string> {
  const id = newId();
  await db.insert(companies).values({ id, accountId, name });
  return id;
}

interface NewPerson {
  passwordHash: string;
  name?: string;
  email?: string;
}

export async function insertPerson(
  db: Queryable,
  { passwordHash, name = 'A person', email = `${newId()}@test.example` }: NewPerson,
): Promise<string> {
  const userId = newId();
  await db.insert(users).values({ id: userId, passwordHash });
  await db.insert(people).values({ userId, name, email });
  return userId;
}

interface NewMembership {
  accountId: string;
  userId: string;
  roles: readonly string[];
  /** Guests only. */
  companyId?: string | null;
}

export async function insertMembership(
  db: Queryable,
  { accountId, userId, roles, companyId = null }: NewMembership,
) {
  await db.insert(memberships).values({ accountId, userId, roles: [...roles], companyId });
}
