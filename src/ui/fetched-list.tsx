import { useState } from 'react';
import type { ReactNode } from 'react';
import { EmptyState } from './empty-state';
import { FailedState } from './failed-state';
import { LoadingState } from './loading-state';
import { Small } from './text';
import { Stack } from './stack';
import { TextField } from './text-field';

export interface FetchedListProps<Item> {
  /** 'packs' */
  what: string;
  fetched: { data: Item[] | undefined; isPending: boolean; isRefetching: boolean; refetch: () => unknown };
  failure: { title: string; message: string; reference?: string };
  empty: { title: string; text: string; action?: ReactNode };
  textOf: (item: Item) => string;
  children: (items: Item[]) => ReactNode;
}

const SEARCH_FROM = 8;

/** A list being fetched, failed, empty, or searched by words once it is long. */
export function FetchedList<Item>({
  what,
  fetched,
  failure,
  empty,
  textOf,
  children,
}: FetchedListProps<Item>) {
  const [search, setSearch] = useState('');
  if (fetched.data === undefined) {
    return fetched.isPending ? (
      <LoadingState what={`Fetching the ${what}`} />
    ) : (
      <FailedState {...failure} onRetry={() => void fetched.refetch()} isRetrying={fetched.isRefetching} />
    );
  }
  if (fetched.data.length === 0) {
    return (
      <EmptyState title={empty.title} action={empty.action}>
        {empty.text}
      </EmptyState>
    );
  }
  const words = search
    .toLowerCase()
    .split(/\s+/)
    .filter((word) => word !== '');
  const found = fetched.data.filter((item) => {
    const text = textOf(item).toLowerCase();
    return words.every((word) => text.includes(word));
  });
  return (
    <Stack gap="x3">
      {fetched.data.length < SEARCH_FROM ? null : (
        <TextField
          label="Search"
          value={search}
          onChange={setSearch}
          options={{ type: 'search', isOptional: true }}
        />
      )}
      {found.length === 0 ? <Small>{`Nothing matches “${search.trim()}”.`}</Small> : children(found)}
    </Stack>
  );
}
