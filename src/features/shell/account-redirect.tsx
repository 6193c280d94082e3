import { Redirect } from 'expo-router';
import type { Href } from 'expo-router';
import { landingPlace, useAccount } from '../../session';

/** The account's bare address leads to the first place of the person's role. */
export function AccountRedirect() {
  const account = useAccount();
  return <Redirect href={`${account.basePath}/${landingPlace(account.roles)}` as Href} />;
}
