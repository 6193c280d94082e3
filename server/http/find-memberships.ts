import { and, eq } from 'drizzle-orm';
import { ROLES, type Role } from '../../shared/contract/session';
import type { Queryable } from '../db/client';
import { memberships } from '../db/schema';
import type { Actor } from './route-definition';

/** What a user is in one account; undefined for a stranger. */
export async function findActor(
  db: Queryable,
  userId: string,
  accountId: string,
): Promise<Actor | undefined> {
  const [row] = await db
    .select()
    .from(memberships)
    .where(and(eq(memberships.userId, userId), eq(memberships.accountId, accountId)));
  return row && { userId, accountId, roles: row.roles.filter(isRole), companyId: row.companyId };
}

/** Every role that a user has anywhere. */
export async function findRolesAnywhere(db: Queryable, userId: string): Promise<Role[]> {
  const rows = await db
    .select({ roles: memberships.roles })
    .from(memberships)
    .where(eq(memberships.userId, userId));
  return rows.flatMap((row) => row.roles.filter(isRole));
}

export function isRole(name: string): name is Role {
  return ROLES.some((role) => role === name);
}
