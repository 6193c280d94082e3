import { Button } from './button';
import { Notice } from './notice';
import { Label, Small } from './text';
import { Stack } from './stack';

export interface FailedStateProps {
  title: string;
  /** What went wrong and what would help. */
  message: string;
  onRetry?: () => void;
  isRetrying?: boolean;
  /** To quote when asking for help: the request's id. */
  reference?: string;
}

export function FailedState({ title, message, onRetry, isRetrying = false, reference }: FailedStateProps) {
  return (
    <Notice
      kind="error"
      title={title}
      isLive
      action={
        onRetry === undefined ? undefined : (
          <Button label="Try again" onPress={onRetry} isBusy={isRetrying} busyLabel="Trying…" />
        )
      }
    >
      <Stack gap="x1">
        <Small tone="ink">{message}</Small>
        {reference === undefined || reference === '' ? null : <Label>{`Reference ${reference}`}</Label>}
      </Stack>
    </Notice>
  );
}
