import type { ReactNode } from 'react';
import { Button } from './button';
import { Notice } from './notice';
import { Inline, Stack } from './stack';
import { Small } from './text';

export interface ConflictNoticeProps {
  /** What both edited: 'This wall'. */
  what: string;
  /** Saves one's own on top of the newer state. */
  onKeepMine: () => void;
  /** Drops one's own changes for the newer state. */
  onTakeTheirs: () => void;
  isBusy?: boolean;
  /** What differs, where it can be said. */
  children?: ReactNode;
}

/** Somebody else saved first. Nothing typed is lost until one of the two is chosen. */
export function ConflictNotice({
  what,
  onKeepMine,
  onTakeTheirs,
  isBusy = false,
  children,
}: ConflictNoticeProps) {
  return (
    <Notice kind="error" title={`${what} was changed by somebody else meanwhile`} isLive>
      <Stack gap="x3">
        <Small tone="ink">
          Your changes are still here and not yet saved. Save them on top of the newer state, or take that
          state and let yours go.
        </Small>
        {children}
        <Inline>
          <Button
            label="Save mine on top"
            kind="primary"
            onPress={onKeepMine}
            isBusy={isBusy}
            busyLabel="Saving…"
          />
          <Button label="Take the newer state" onPress={onTakeTheirs} isDisabled={isBusy} />
        </Inline>
      </Stack>
    </Notice>
  );
}
