import type { ReactNode } from 'react';
import { EmptyState } from './empty-state';
import { FailedState } from './failed-state';
import { Link } from './link';
import { LoadingState } from './loading-state';
import { Screen } from './screen';

export interface FetchedScreenProps<Data> {
  /** Stands as the heading until the data are there. */
  title: string;
  back: { href: string; label: string };
  fetched: { data: Data | undefined; isPending: boolean; isRefetching: boolean; refetch: () => unknown };
  isMissing: boolean;
  failure: { title: string; message: string; reference?: string };
  children: (data: Data) => ReactNode;
}

/** A screen of one thing: being fetched, not there, failed; or the thing. */
export function FetchedScreen<Data>({
  title,
  back,
  fetched,
  isMissing,
  failure,
  children,
}: FetchedScreenProps<Data>) {
  if (fetched.data !== undefined) return children(fetched.data);
  return (
    <Screen title={title} back={back}>
      {fetched.isPending ? (
        <LoadingState what={`Fetching: ${title.toLowerCase()}`} />
      ) : isMissing ? (
        <EmptyState
          title="It is not there"
          action={<Link href={back.href}>{`To the ${back.label.toLowerCase()}`}</Link>}
        >
          It may belong to another account, or the address is cut short.
        </EmptyState>
      ) : (
        <FailedState {...failure} onRetry={() => void fetched.refetch()} isRetrying={fetched.isRefetching} />
      )}
    </Screen>
  );
}
