import { useMutation, useQueryClient } from '@tanstack/react-query';
import type { StudyWithResult } from '../../../../shared/contract/studies';
import { describeError } from '../../../api/describe-error';
import { useIdempotencyKey } from '../../../api/use-idempotency-key';
import { useAccount } from '../../../session';
import { Button, Notice, Small, Stack } from '../../../ui';
import { refreshStudy, runStudyAgain } from '../study-queries';

/** Says that the answer is older than what the study now uses, and computes a new one. */
export function RunAgain({ study }: { study: StudyWithResult }) {
  const account = useAccount();
  const queryClient = useQueryClient();
  const idempotency = useIdempotencyKey();
  const run = useMutation({
    mutationFn: () =>
      runStudyAgain(
        { accountId: account.id, studyId: study.id },
        idempotency.keyFor(study.latest_result?.id ?? study.id),
      ),
    onSuccess: async () => {
      idempotency.renew();
      await refreshStudy(queryClient, account.id, study.id);
    },
  });
  const isFirst = study.latest_result === null;
  return (
    <Notice
      kind="caution"
      title={isFirst ? 'No answer yet' : 'Newer data exist than this answer used'}
      action={
        <Button
          label={isFirst ? 'Run it' : 'Run again'}
          kind="primary"
          onPress={() => {
            if (!run.isPending) run.mutate();
          }}
          isBusy={run.isPending}
          busyLabel="Computing…"
        />
      }
    >
      <Stack gap="x1">
        <Small tone="ink">
          {isFirst
            ? 'The study is kept; its answer is computed when you run it.'
            : 'Something the study uses was revised since. The answer below stays as it was until you run the study again.'}
        </Small>
        {run.isError ? (
          <Notice kind="error" isLive title={describeError(run.error, 'The study could not be run').title}>
            {describeError(run.error, '').message}
          </Notice>
        ) : null}
      </Stack>
    </Notice>
  );
}
