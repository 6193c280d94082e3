import { useState } from 'react';
import type { DisplayUnitSystem } from '../../shared/units/format';
import { useAccount } from './account';
import { loadDraft } from './draft-store';
import { useUnitSystem } from './session-provider';
import { useDraft } from './use-draft';

/** What is kept of a form that is not saved: its fields as typed, in which units, and the revision it began from. */
interface KeptForm<Values> {
  values: Values;
  unitSystem: DisplayUnitSystem;
  /** Null for something new. */
  baseRevisionId: string | null;
}

export interface FormDraft<Values> {
  /** What the form starts with: what was left here, or `fresh`. */
  start: Values;
  isRestored: boolean;
  /** The revision that `start` was typed on. */
  baseRevisionId: string | null;
  /** What the form would hold had nobody typed. */
  fresh: Values;
  keep: (values: Values, baseRevisionId: string | null) => void;
  clear: () => void;
}

/** A form's fields, kept through reloads and Back; `name` as 'packs/new'. */
export function useFormDraft<Values extends object>(
  name: string,
  fresh: { values: Values; baseRevisionId: string | null },
): FormDraft<Values> {
  const unitSystem = useUnitSystem();
  const draft = useDraft<KeptForm<Values>>(
    name,
    { ...fresh, unitSystem },
    (stored): stored is KeptForm<Values> => isKeptForm(stored, fresh.values, unitSystem),
  );
  const [start] = useState({ ...draft.content, isRestored: draft.isRestored });
  return {
    start: start.values,
    isRestored: start.isRestored,
    baseRevisionId: start.baseRevisionId,
    fresh: fresh.values,
    keep: (values, baseRevisionId) => {
      if (JSON.stringify(values) === JSON.stringify(fresh.values)) draft.clear();
      else draft.save({ values, baseRevisionId, unitSystem });
    },
    clear: draft.clear,
  };
}

/** Whether something was left under a name when its page was opened. */
export function useHasDraft(name: string): boolean {
  const { userId, id: accountId } = useAccount();
  const [hasDraft] = useState(() => loadDraft({ userId, accountId, name }) !== undefined);
  return hasDraft;
}

/** Numbers typed in other units would read as other values, so such a draft is dropped. */
export function isKeptForm(stored: unknown, like: object, unitSystem: DisplayUnitSystem): boolean {
  return (
    isRecord(stored) &&
    stored.unitSystem === unitSystem &&
    (stored.baseRevisionId === null || typeof stored.baseRevisionId === 'string') &&
    hasShapeOf(stored.values, like)
  );
}

/** Every key of the pattern with a value of its type; entries of a list like the first of the pattern's. */
function hasShapeOf(value: unknown, pattern: unknown): boolean {
  if (Array.isArray(pattern)) {
    const [first] = pattern as unknown[];
    return Array.isArray(value) && value.every((entry) => first === undefined || hasShapeOf(entry, first));
  }
  if (isRecord(pattern))
    return isRecord(value) && Object.keys(pattern).every((key) => hasShapeOf(value[key], pattern[key]));
  return typeof value === typeof pattern;
}

function isRecord(value: unknown): value is Record<string, unknown> {
  return typeof value === 'object' && value !== null && !Array.isArray(value);
}
