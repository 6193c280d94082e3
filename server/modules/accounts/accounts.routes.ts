import {
  auditEntriesPath,
  auditPageSchema,
  teamPath,
  teamResponseSchema,
} from '../../../shared/contract/accounts';
import { pageQuerySchema } from '../../../shared/contract/fields';
import type { Database } from '../../db/client';
import { accountRoute, type RouteDefinition } from '../../http/route-definition';
import { getTeam } from './get-team';
import { listAuditEntries } from './list-audit-entries';

export function accountRoutes({ db }: { db: Database }): RouteDefinition[] {
  return [
    accountRoute({
      method: 'get',
      path: teamPath(':account_id'),
      summary: 'Who belongs to the account, and how many seats are in use',
      roles: ['admin'],
      responses: { 200: teamResponseSchema },
      handle: async ({ actor }) => ({ status: 200, body: await getTeam(db, actor.accountId) }),
    }),
    accountRoute({
      method: 'get',
      path: auditEntriesPath(':account_id'),
      summary: 'What happened in the account, newest first',
      roles: ['admin'],
      querySchema: pageQuerySchema,
      responses: { 200: auditPageSchema },
      handle: async ({ actor, query }) => ({
        status: 200,
        body: await listAuditEntries(db, { accountId: actor.accountId, ...query }),
      }),
    }),
  ];
}
