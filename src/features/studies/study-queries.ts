import { infiniteQueryOptions, queryOptions } from '@tanstack/react-query';
import type { QueryClient } from '@tanstack/react-query';
import { collectionPath, type Page } from '../../../shared/contract/kept-things';
import type { Study, StudyResult, StudySpec, StudyWithResult } from '../../../shared/contract/studies';
import { httpClient } from '../../api/http-client';
import { STALE_MS } from '../../api/stale-times';

const STUDIES_PER_PAGE = 20;

/** Key, fetcher, type and stale time of an account's studies. */
export function studyQueries(accountId: string) {
  const path = collectionPath(accountId, 'studies');
  const key = ['accounts', accountId, 'studies'] as const;
  return {
    key,
    /** Newest first, a page at a time. */
    pages: () =>
      infiniteQueryOptions({
        queryKey: [...key, 'pages'],
        queryFn: ({ signal, pageParam }) => {
          const after = pageParam === null ? '' : `&after=${pageParam}`;
          return httpClient.get<Page<Study>>(`${path}?limit=${STUDIES_PER_PAGE}${after}`, { signal });
        },
        initialPageParam: null as string | null,
        getNextPageParam: (last) => last.next_after,
        staleTime: STALE_MS.edited,
      }),
    one: (id: string) =>
      queryOptions({
        queryKey: [...key, 'one', id],
        queryFn: ({ signal }) => httpClient.get<StudyWithResult>(`${path}/${id}`, { signal }),
        staleTime: STALE_MS.edited,
      }),
  };
}

export function createStudy(
  accountId: string,
  spec: StudySpec,
  idempotencyKey: string,
): Promise<StudyWithResult> {
  return httpClient.post(collectionPath(accountId, 'studies'), { spec }, { idempotencyKey });
}

/** `baseRevisionId`: what the change started from; a lost race throws edited_meanwhile with the newer state. */
export function reviseStudy(
  at: { accountId: string; studyId: string; baseRevisionId: string },
  spec: StudySpec,
): Promise<StudyWithResult> {
  const path = `${collectionPath(at.accountId, 'studies')}/${at.studyId}`;
  return httpClient.put(path, { spec }, { ifMatch: at.baseRevisionId });
}

/** With the newest revisions of everything the study uses. */
export function runStudyAgain(
  at: { accountId: string; studyId: string },
  idempotencyKey: string,
): Promise<StudyResult> {
  return httpClient.post(
    `${collectionPath(at.accountId, 'studies')}/${at.studyId}/results`,
    {},
    { idempotencyKey },
  );
}

/** After a save or a run: the list and the study are asked again. */
export async function refreshStudy(
  queryClient: QueryClient,
  accountId: string,
  studyId: string,
): Promise<void> {
  const queries = studyQueries(accountId);
  await Promise.all([
    queryClient.invalidateQueries({ queryKey: queries.pages().queryKey }),
    queryClient.invalidateQueries({ queryKey: queries.one(studyId).queryKey }),
  ]);
}
