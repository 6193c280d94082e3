import { queryOptions } from '@tanstack/react-query';
import { auditEntriesPath, teamPath } from '../../../shared/contract/accounts';
import type { AuditEntry, TeamResponse } from '../../../shared/contract/accounts';
import type { Page } from '../../../shared/contract/kept-things';
import { httpClient } from '../../api/http-client';
import { STALE_MS } from '../../api/stale-times';

export function teamQuery(accountId: string) {
  return queryOptions({
    queryKey: ['accounts', accountId, 'team'],
    queryFn: ({ signal }) => httpClient.get<TeamResponse>(teamPath(accountId), { signal }),
    staleTime: STALE_MS.edited,
  });
}

export function latestAuditEntriesQuery(accountId: string) {
  return queryOptions({
    queryKey: ['accounts', accountId, 'audit-entries', 'latest'],
    queryFn: ({ signal }) =>
      httpClient.get<Page<AuditEntry>>(`${auditEntriesPath(accountId)}?limit=20`, { signal }),
    staleTime: 0,
  });
}
