import { useQuery } from '@tanstack/react-query';
import { Redirect, useLocalSearchParams } from 'expo-router';
import { useState } from 'react';
import { View } from 'react-native';
import { useSession } from '../../session';
import { Body, Link, Notice, SPACE, Screen, Sheet } from '../../ui';
import { DemoPeople } from './components/demo-people';
import { SignInForm } from './sign-in-form';
import type { SignInValues } from './sign-in-form';
import { safeNext } from './safe-next';
import { demoPeopleQuery } from './sign-in-queries';

export function SignInScreen() {
  const session = useSession();
  const { next } = useLocalSearchParams<{ next?: string }>();
  const demoPeople = useQuery(demoPeopleQuery());
  const [filled, setFilled] = useState<SignInValues>({ email: '', password: '' });
  if (session.status === 'signed-in') return <Redirect href={safeNext(next)} />;
  const people = demoPeople.data ?? [];
  return (
    <Screen title="Sign in" width={people.length === 0 ? 'narrow' : 'pair'}>
      <Body tone="second">
        Larderline tells how many days a food keeps in a given wall, what ends it, and which numbers that
        leans on.
      </Body>
      {session.status === 'signed-out' && session.reason === 'expired' ? (
        <Notice kind="caution" isLive>
          Your session has ended. Drafts on this device are kept; sign in to go on.
        </Notice>
      ) : null}
      {session.status === 'signed-out' && session.reason === 'left' ? (
        <Notice isLive>You are signed out. Drafts on this device are gone.</Notice>
      ) : null}
      <View style={{ flexDirection: 'row', flexWrap: 'wrap', alignItems: 'flex-start', gap: SPACE.x4 }}>
        <View style={{ flexGrow: 1, flexBasis: 300, minWidth: 0 }}>
          <Sheet>
            <SignInForm key={filled.email} filled={filled} />
            <View style={{ alignItems: 'flex-start', marginBottom: -SPACE.x3 }}>
              <Link href="/forgotten-password" size="small" isStandalone>
                Forgotten password
              </Link>
            </View>
          </Sheet>
        </View>
        {people.length === 0 ? null : (
          <View style={{ flexGrow: 1, flexBasis: 300, minWidth: 0 }}>
            <DemoPeople people={people} onChoose={({ email, password }) => setFilled({ email, password })} />
          </View>
        )}
      </View>
    </Screen>
  );
}
