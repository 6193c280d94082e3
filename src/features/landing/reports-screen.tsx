import { useAccount } from '../../session';
import { Body, EmptyState, Heading, Screen, Stack } from '../../ui';

/** A client's first screen. */
export function ReportsScreen() {
  const account = useAccount();
  const company = account.company?.name ?? 'your company';
  return (
    <Screen title="Reports" subtitle={`shared by ${account.name} with ${company}`}>
      <EmptyState title="No report is shared with you now">
        {`When an engineer of ${account.name} shares a report, it stands here: how many days the food keeps in which wall, what ends it, and what the answer was made from.`}
      </EmptyState>
      <Stack gap="x2">
        <Heading>What a report is</Heading>
        <Body tone="second">
          A numbered edition that never changes. One that turns out wrong is withdrawn and says so; it is not
          rewritten.
        </Body>
      </Stack>
    </Screen>
  );
}
