import { eq } from 'drizzle-orm';
import type { TeamResponse } from '../../../shared/contract/accounts';
import type { Queryable } from '../../db/client';
import { companies, memberships, people } from '../../db/schema';
import { isRole } from '../../http/find-memberships';

/** Engineers and admins take a seat each, whoever is both takes one; guests take none. */
export async function getTeam(db: Queryable, accountId: string): Promise<TeamResponse> {
  const rows = await db
    .select({ membership: memberships, person: people, company: companies })
    .from(memberships)
    .innerJoin(people, eq(people.userId, memberships.userId))
    .leftJoin(companies, eq(companies.id, memberships.companyId))
    .where(eq(memberships.accountId, accountId))
    .orderBy(people.name);
  return {
    seats_in_use: rows.filter(({ membership }) => membership.companyId === null).length,
    people: rows.map(({ membership, person, company }) => ({
      user_id: membership.userId,
      name: person.name,
      email: person.email,
      roles: membership.roles.filter(isRole),
      company: company && { id: company.id, name: company.name },
    })),
  };
}
