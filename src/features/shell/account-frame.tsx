import { Redirect, useLocalSearchParams, usePathname } from 'expo-router';
import { useMemo } from 'react';
import type { ReactNode } from 'react';
import { AccountProvider, toAccount, useSession, useSessionActions } from '../../session';
import { LoadingState, Screen } from '../../ui';
import { NotFoundScreen } from './not-found-screen';
import { PlainPage } from './plain-page';
import { Shell } from './shell';
import { UnreachableScreen } from './unreachable-screen';

/** Round every screen of an account: who may be here, and the account that the address names. */
export function AccountFrame({ children }: { children: ReactNode }) {
  const state = useSession();
  const { ask } = useSessionActions();
  const pathname = usePathname();
  const { account: slug } = useLocalSearchParams<{ account: string }>();
  const account = useMemo(() => {
    if (state.status !== 'signed-in') return null;
    const membership = state.session.memberships.find((entry) => entry.account.slug === slug);
    return membership === undefined ? null : toAccount(membership, state.session.user.id);
  }, [state, slug]);

  if (state.status === 'asking') {
    return (
      <PlainPage>
        <Screen title="Larderline">
          <LoadingState what="Looking who is signed in" />
        </Screen>
      </PlainPage>
    );
  }
  if (state.status === 'unreachable') {
    return (
      <PlainPage>
        <UnreachableScreen error={state.error} onRetry={() => void ask()} />
      </PlainPage>
    );
  }
  if (state.status === 'signed-out') {
    // The router knows only as much of the address as it has drawn; the browser knows all of it.
    // Who left on purpose begins afresh; who was interrupted comes back to where they were.
    const next = state.reason === 'left' ? '' : `?next=${encodeURIComponent(window.location.pathname)}`;
    return <Redirect href={`/sign-in${next}`} />;
  }
  if (account === null) {
    return (
      <PlainPage>
        <NotFoundScreen />
      </PlainPage>
    );
  }
  return (
    <AccountProvider key={account.id} account={account}>
      <Shell pathname={pathname}>{children}</Shell>
    </AccountProvider>
  );
}
