import { queryOptions } from '@tanstack/react-query';
import { isApiError } from '../../api/api-error';
import { STALE_MS } from '../../api/stale-times';
import { fetchDemoPeople } from '../../session/session-requests';
import type { DemoPerson } from '../../session/session-requests';

/** Empty outside demo mode, where the path does not exist. */
export function demoPeopleQuery() {
  return queryOptions({
    queryKey: ['demo-people'],
    queryFn: async (): Promise<DemoPerson[]> => {
      try {
        return await fetchDemoPeople();
      } catch (error) {
        if (isApiError(error, 'not_found')) return [];
        throw error;
      }
    },
    staleTime: STALE_MS.session,
  });
}
