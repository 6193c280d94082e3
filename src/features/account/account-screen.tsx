import { View } from 'react-native';
import { useAccount, useSession } from '../../session';
import { Body, Row, Screen, Sheet, TitleBlock } from '../../ui';
import { AppearanceChoice } from './components/appearance-choice';
import { SignOutButton } from './components/sign-out-button';
import { UnitSystemChoice } from './components/unit-system-choice';
import { accountHref, rolesInWords } from './account-words';

export function AccountScreen() {
  const session = useSession();
  const account = useAccount();
  if (session.status !== 'signed-in') return null;
  const { user, memberships } = session.session;
  const others = memberships.filter((membership) => membership.account.slug !== account.slug);
  return (
    <Screen title="Account" subtitle={user.name} action={<SignOutButton />}>
      <Sheet title="Preferences">
        <UnitSystemChoice chosen={user.unit_system} />
        <AppearanceChoice />
      </Sheet>
      {others.length === 0 ? null : (
        <Sheet title="Your other accounts">
          <View>
            {others.map((membership, index) => (
              <Row
                key={membership.account.id}
                label={membership.account.name}
                detail={rolesInWords(membership)}
                href={accountHref(membership)}
                isLast={index === others.length - 1}
              />
            ))}
          </View>
        </Sheet>
      )}
      <TitleBlock
        label="You in this account"
        cells={[
          { label: 'name', value: user.name },
          { label: 'e-mail', value: user.email },
          { label: 'account', value: account.name },
          { label: 'role', value: rolesInWords(account) },
          { label: 'currency', value: account.currency },
        ]}
      />
      <Body tone="second">Signing out removes the drafts kept on this device.</Body>
    </Screen>
  );
}
