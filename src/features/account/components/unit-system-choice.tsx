import { useMutation } from '@tanstack/react-query';
import type { UnitSystem } from '../../../../shared/contract/session';
import { describeError } from '../../../api/describe-error';
import { useSessionActions } from '../../../session';
import { Choice, Stack, StatusLine } from '../../../ui';

const OPTIONS = [
  { value: 'metric', label: 'Metric' },
  { value: 'us_customary', label: 'US customary' },
];

export function UnitSystemChoice({ chosen }: { chosen: UnitSystem }) {
  const { chooseUnitSystem } = useSessionActions();
  const choose = useMutation({ mutationFn: chooseUnitSystem });
  const shown = choose.isPending ? choose.variables : chosen;
  return (
    <Stack gap="x1">
      <Choice
        label="Units"
        hint="How figures are shown and read, on every device and in every account. What is kept does not change."
        value={shown}
        options={OPTIONS}
        onChange={(value) => choose.mutate(value === 'us_customary' ? 'us_customary' : 'metric')}
        error={choose.isError ? describeError(choose.error, 'The choice was not kept').message : undefined}
      />
      <StatusLine
        message={choose.isPending ? 'Keeping your choice…' : choose.isSuccess ? 'Your choice is kept.' : ''}
      />
    </Stack>
  );
}
