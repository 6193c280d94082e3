import { useAccount } from '../../session';
import { Body, EmptyState, Heading, Screen, Stack } from '../../ui';

/** A supplier's first screen. */
export function RequestsScreen() {
  const account = useAccount();
  const company = account.company?.name ?? 'your company';
  return (
    <Screen title="Requests" subtitle={`from ${account.name} to ${company}`}>
      <EmptyState title="Nothing is waiting for you now">
        {`When ${account.name} wants a film or a laminate of yours measured, the request is listed here: which material, which method and conditions, and by when.`}
      </EmptyState>
      <Stack gap="x2">
        <Heading>What others see of you</Heading>
        <Body tone="second">
          {`Only engineers and admins of ${account.name} see what ${company} hands in. Other suppliers and clients never do.`}
        </Body>
      </Stack>
    </Screen>
  );
}
