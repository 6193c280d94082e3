import { useQuery } from '@tanstack/react-query';
import { describeError } from '../../api/describe-error';
import { useAccount } from '../../session';
import { DataTable, FailedState, Figure, LoadingState, Screen, Sheet } from '../../ui';
import { auditRow, personRow } from './team-rows';
import { latestAuditEntriesQuery, teamQuery } from './team-queries';

/** An admin's first screen: who is in the account, the seats they take, what happened last. */
export function TeamScreen() {
  const account = useAccount();
  return (
    <Screen title="Team" subtitle={account.name} width="wide">
      <People accountId={account.id} />
      <AuditLog accountId={account.id} />
    </Screen>
  );
}

function People({ accountId }: { accountId: string }) {
  const team = useQuery(teamQuery(accountId));
  if (team.isPending) return <LoadingState what="Fetching the team" />;
  if (team.isError) {
    return (
      <FailedState
        {...describeError(team.error, 'The team could not be fetched')}
        onRetry={() => void team.refetch()}
        isRetrying={team.isFetching}
      />
    );
  }
  const { seats_in_use: seatsInUse, people } = team.data;
  return (
    <Sheet
      title="People"
      subtitle="Engineers and admins take one seat each; suppliers and clients are guests. This page only shows who is in the account; nothing can be changed here."
      action={<Figure value={String(seatsInUse)} unit={seatsInUse === 1 ? 'seat' : 'seats'} size="title" />}
    >
      <DataTable
        caption="People in this account"
        isCaptionHidden
        columns={[
          { key: 'name', title: 'Name' },
          { key: 'roles', title: 'Role' },
          { key: 'company', title: 'Company' },
          { key: 'email', title: 'E-mail' },
        ]}
        rows={people.map(personRow)}
      />
    </Sheet>
  );
}

function AuditLog({ accountId }: { accountId: string }) {
  const entries = useQuery(latestAuditEntriesQuery(accountId));
  if (entries.isPending) return <LoadingState what="Fetching the audit log" />;
  if (entries.isError) {
    return (
      <FailedState
        {...describeError(entries.error, 'The audit log could not be fetched')}
        onRetry={() => void entries.refetch()}
        isRetrying={entries.isFetching}
      />
    );
  }
  return (
    <Sheet
      title="What happened last"
      subtitle="The latest entries of the audit log, newest first; nobody can change them."
    >
      <DataTable
        caption="Latest entries of the audit log"
        isCaptionHidden
        columns={[
          { key: 'at', title: 'When', unit: 'UTC', kind: 'code' },
          { key: 'who', title: 'Who' },
          { key: 'what', title: 'What' },
          { key: 'subject', title: 'On' },
        ]}
        rows={entries.data.items.map(auditRow)}
        emptyText="Nothing happened so far."
      />
    </Sheet>
  );
}
