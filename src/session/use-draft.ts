import { useCallback, useMemo, useState } from 'react';
import { useAccount } from './account';
import { clearDraft, loadDraft, saveDraft } from './draft-store';

export interface Draft<Content> {
  content: Content;
  /** True where it was found from an earlier visit: worth saying on screen. */
  isRestored: boolean;
  save: (content: Content) => void;
  /** After saving for good, or when the person drops it. */
  clear: () => void;
}

/**
 * What is being written, kept through reloads. `isReadable` tells whether a stored text still has today's shape; what
 * has not is dropped.
 */
export function useDraft<Content>(
  name: string,
  initial: Content,
  isReadable: (stored: unknown) => stored is Content,
): Draft<Content> {
  const { userId, id: accountId } = useAccount();
  const key = useMemo(() => ({ userId, accountId, name }), [userId, accountId, name]);
  const [{ content, isRestored }, setState] = useState(() => {
    const stored = loadDraft(key);
    return isReadable(stored)
      ? { content: stored, isRestored: true }
      : { content: initial, isRestored: false };
  });

  const save = useCallback(
    (next: Content) => {
      saveDraft(key, next);
      setState({ content: next, isRestored: false });
    },
    [key],
  );
  const clear = useCallback(() => {
    clearDraft(key);
    setState({ content: initial, isRestored: false });
  }, [key, initial]);

  return { content, isRestored, save, clear };
}
