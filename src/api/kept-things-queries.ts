import { queryOptions } from '@tanstack/react-query';
import type { QueryClient } from '@tanstack/react-query';
import type { FoodSpec as FoodSpecOfSchema } from '../../shared/contract/foods';
import {
  collectionPath,
  type Collection,
  type KeptThing,
  type Page,
  type Revision,
} from '../../shared/contract/kept-things';
import type { LaminateSpec } from '../../shared/contract/laminates';
import type { MaterialSpec } from '../../shared/contract/materials';
import type { PackSpec } from '../../shared/contract/packs';
import type { RouteSpec } from '../../shared/contract/routes';
import type { FoodDescription } from '../../shared/engine/description/storage-description';
import { httpClient } from './http-client';
import { STALE_MS } from './stale-times';

/** The schema's isotherm is chosen lazily, which inference does not see through; the engine's type says what it is. */
export type FoodSpec = Omit<FoodSpecOfSchema, 'food'> & { food: FoodDescription };

export interface SpecByCollection {
  materials: MaterialSpec;
  laminates: LaminateSpec;
  packs: PackSpec;
  foods: FoodSpec;
  routes: RouteSpec;
}

export type KeptMaterial = KeptThing<MaterialSpec>;
export type KeptLaminate = KeptThing<LaminateSpec>;

const FULL_PAGE = 200;

/** Key, fetcher and stale time of one collection of an account. */
export function keptThingsQueries<Name extends Collection>(accountId: string, collection: Name) {
  type Spec = SpecByCollection[Name];
  const path = collectionPath(accountId, collection);
  const key = ['accounts', accountId, collection] as const;
  return {
    key,
    /** The whole collection, newest first: pages are followed by key to the end. */
    all: () =>
      queryOptions({
        queryKey: [...key, 'all'],
        queryFn: ({ signal }) => fetchAllPages<KeptThing<Spec>>(path, signal),
        staleTime: STALE_MS.edited,
      }),
    one: (id: string) =>
      queryOptions({
        queryKey: [...key, 'one', id],
        queryFn: ({ signal }) => httpClient.get<KeptThing<Spec>>(`${path}/${id}`, { signal }),
        staleTime: STALE_MS.edited,
      }),
    /** Newest first. */
    revisions: (id: string) =>
      queryOptions({
        queryKey: [...key, 'revisions', id],
        queryFn: ({ signal }) => fetchAllPages<Revision<Spec>>(`${path}/${id}/revisions`, signal),
        staleTime: STALE_MS.edited,
      }),
  };
}

export interface CreateOptions {
  idempotencyKey: string;
}

export function createKeptThing<Name extends Collection>(
  at: { accountId: string; collection: Name },
  spec: SpecByCollection[Name],
  { idempotencyKey }: CreateOptions,
): Promise<KeptThing<SpecByCollection[Name]>> {
  return httpClient.post(collectionPath(at.accountId, at.collection), { spec }, { idempotencyKey });
}

export interface ReviseOptions {
  id: string;
  /** The revision that the change started from; a lost race throws edited_meanwhile with the newer state. */
  baseRevisionId: string;
}

export function reviseKeptThing<Name extends Collection>(
  at: { accountId: string; collection: Name },
  spec: SpecByCollection[Name],
  { id, baseRevisionId }: ReviseOptions,
): Promise<KeptThing<SpecByCollection[Name]>> {
  return httpClient.put(
    `${collectionPath(at.accountId, at.collection)}/${id}`,
    { spec },
    { ifMatch: baseRevisionId },
  );
}

/** After a save: the thing is known, what lists it is asked again. */
export async function keepSaved<Name extends Collection>(
  queryClient: QueryClient,
  at: { accountId: string; collection: Name },
  saved: KeptThing<SpecByCollection[Name]>,
): Promise<void> {
  const queries = keptThingsQueries(at.accountId, at.collection);
  queryClient.setQueryData([...queries.key, 'one', saved.id], saved);
  await Promise.all([
    queryClient.invalidateQueries({ queryKey: [...queries.key, 'all'] }),
    queryClient.invalidateQueries({ queryKey: [...queries.key, 'revisions', saved.id] }),
    // Studies say when something they use has a newer revision.
    queryClient.invalidateQueries({ queryKey: ['accounts', at.accountId, 'studies'] }),
  ]);
}

async function fetchAllPages<Item>(path: string, signal: AbortSignal): Promise<Item[]> {
  const items: Item[] = [];
  let after: string | null = null;
  do {
    const query: string = after === null ? `limit=${FULL_PAGE}` : `limit=${FULL_PAGE}&after=${after}`;
    const page: Page<Item> = await httpClient.get<Page<Item>>(`${path}?${query}`, { signal });
    items.push(...page.items);
    after = page.next_after;
  } while (after !== null);
  return items;
}
