import { Redirect } from 'expo-router';
import type { Href } from 'expo-router';
import { landingHref, useSession, useSessionActions } from '../../session';
import { Body, Button, LoadingState, Screen } from '../../ui';
import { PlainPage } from './plain-page';
import { UnreachableScreen } from './unreachable-screen';

/** The bare address leads each person to the first place of their role, or to the sign-in page. */
export function HomeRedirect() {
  const state = useSession();
  const { ask, signOut } = useSessionActions();
  if (state.status === 'signed-out') return <Redirect href="/sign-in" />;
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
  const first = state.session.memberships[0];
  if (first !== undefined) return <Redirect href={landingHref(first) as Href} />;
  return (
    <PlainPage>
      <Screen title="You belong to no account" width="narrow">
        <Body tone="second">{`${state.session.user.email} is known here, but no account has you in it now. Ask the admin of yours to invite you again.`}</Body>
        <Button label="Sign out" onPress={() => void signOut()} />
      </Screen>
    </PlainPage>
  );
}
