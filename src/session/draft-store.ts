const PREFIX = 'draft';

export interface DraftKey {
  userId: string;
  accountId: string;
  name: string;
}

/** Drafts stay on the device, under the person and the account, until saved, dropped or signed out. */
export function saveDraft(key: DraftKey, content: unknown): void {
  withStorage((storage) => storage.setItem(storageKey(key), JSON.stringify(content)));
}

/** undefined where there is none or where it cannot be read any more. */
export function loadDraft(key: DraftKey): unknown {
  return withStorage((storage) => {
    const text = storage.getItem(storageKey(key));
    return text === null ? undefined : (JSON.parse(text) as unknown);
  });
}

export function clearDraft(key: DraftKey): void {
  withStorage((storage) => storage.removeItem(storageKey(key)));
}

export function clearDraftsOfUser(userId: string): void {
  withStorage((storage) => {
    const names = Array.from({ length: storage.length }, (_, index) => storage.key(index));
    for (const name of names) {
      if (name?.startsWith(`${PREFIX}/${userId}/`) === true) storage.removeItem(name);
    }
  });
}

function storageKey({ userId, accountId, name }: DraftKey): string {
  return `${PREFIX}/${userId}/${accountId}/${name}`;
}

// Storage may be closed or full; work then goes on without drafts.
function withStorage<Result>(task: (storage: Storage) => Result): Result | undefined {
  try {
    return task(window.localStorage);
  } catch {
    return undefined;
  }
}
