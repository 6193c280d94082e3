import { useQuery } from '@tanstack/react-query';
import { describeError } from '../../../api/describe-error';
import { keptThingsQueries } from '../../../api/kept-things-queries';
import { useAccount, useUnitSystem } from '../../../session';
import { DataTable, FailedState, LoadingState, Sheet } from '../../../ui';
import { coefficientInWords } from '../si-words';

/** Every revision; what is pinned to an older one stays with it. */
export function MaterialRevisions({ materialId }: { materialId: string }) {
  const account = useAccount();
  const unitSystem = useUnitSystem();
  const revisions = useQuery(keptThingsQueries(account.id, 'materials').revisions(materialId));
  return (
    <Sheet title="Revisions" subtitle="A revision never changes; walls keep the one they were built with.">
      {revisions.isPending ? <LoadingState what="Fetching the revisions" /> : null}
      {revisions.isError ? (
        <FailedState
          {...describeError(revisions.error, 'The revisions could not be fetched')}
          onRetry={() => void revisions.refetch()}
          isRetrying={revisions.isRefetching}
        />
      ) : null}
      {revisions.data === undefined ? null : (
        <DataTable
          caption="Revisions, newest first"
          isCaptionHidden
          columns={[
            { key: 'number', title: 'Revision' },
            { key: 'made', title: 'Made' },
            { key: 'oxygen', title: 'Oxygen', kind: 'figure' },
            { key: 'water', title: 'Water vapour', kind: 'figure' },
          ]}
          rows={revisions.data.map(({ id, number, created_at, created_by, spec }) => ({
            id,
            number: String(number),
            made: `${created_at.slice(0, 10)}${created_by === null ? ', came with the product' : ''}`,
            oxygen:
              spec.kind === 'foil'
                ? 'pinholes only'
                : coefficientInWords('oxygen', spec.oxygen.gas, unitSystem),
            water:
              spec.kind === 'foil'
                ? 'pinholes only'
                : coefficientInWords('water', spec.water.gas, unitSystem),
          }))}
        />
      )}
    </Sheet>
  );
}
