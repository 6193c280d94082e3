import { isWallDraft } from './wall-form';
import type { WallDraft } from './wall-draft';

/** What is kept on the device while a wall is unsaved, with the revision it began from. */
export interface SavedWallDraft {
  wall: WallDraft;
  /** Null for a new wall. */
  baseRevisionId: string | null;
}

export function isSavedWallDraft(value: unknown): value is SavedWallDraft {
  return (
    typeof value === 'object' &&
    value !== null &&
    'wall' in value &&
    isWallDraft(value.wall) &&
    'baseRevisionId' in value &&
    (value.baseRevisionId === null || typeof value.baseRevisionId === 'string')
  );
}
