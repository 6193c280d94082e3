import { useQueryClient } from '@tanstack/react-query';
import { useRef, useState } from 'react';
import type { Collection, KeptThing } from '../../../shared/contract/kept-things';
import { isApiError } from '../api-error';
import { createKeptThing, keepSaved, reviseKeptThing, type SpecByCollection } from '../kept-things-queries';
import { useIdempotencyKey } from '../use-idempotency-key';

export interface KeptThingBase {
  id: string;
  revisionId: string;
}

export interface KeptThingSaver<Spec> {
  /**
   * Creates, or revises what was opened. Resolves to null where somebody else saved meanwhile: `conflict` then holds
   * their state and nothing was written. A second call while one is under way joins it.
   */
  save: (spec: Spec) => Promise<KeptThing<Spec> | null>;
  /** The same on top of the state that won the race. */
  saveOverTheirs: (spec: Spec) => Promise<KeptThing<Spec> | null>;
  /** Leaves what was opened alone. */
  saveAsNew: (spec: Spec) => Promise<KeptThing<Spec> | null>;
  /** Goes on from their state; the caller shows it. */
  acceptTheirs: () => void;
  conflict: KeptThing<Spec> | null;
  isSaving: boolean;
  /** What the next save is built on: changes with every save; null for something not saved yet. */
  baseRevisionId: () => string | null;
}

/** `base` is what was opened, null for something new. */
export function useKeptThingSaver<Name extends Collection>(
  at: { accountId: string; collection: Name },
  base: KeptThingBase | null,
): KeptThingSaver<SpecByCollection[Name]> {
  type Spec = SpecByCollection[Name];
  const queryClient = useQueryClient();
  const idempotency = useIdempotencyKey();
  const openedBase = useRef(base);
  const underWay = useRef<Promise<KeptThing<Spec> | null> | null>(null);
  const [conflict, setConflict] = useState<KeptThing<Spec> | null>(null);
  const [isSaving, setIsSaving] = useState(false);

  const write = (spec: Spec, target: KeptThingBase | null) => {
    underWay.current ??= run(spec, target).finally(() => {
      underWay.current = null;
      setIsSaving(false);
    });
    setIsSaving(true);
    return underWay.current;
  };

  const run = async (spec: Spec, target: KeptThingBase | null): Promise<KeptThing<Spec> | null> => {
    try {
      const saved =
        target === null
          ? await createKeptThing(at, spec, { idempotencyKey: idempotency.keyFor(spec) })
          : await reviseKeptThing(at, spec, { id: target.id, baseRevisionId: target.revisionId });
      idempotency.renew();
      openedBase.current = { id: saved.id, revisionId: saved.revision.id };
      setConflict(null);
      await keepSaved(queryClient, at, saved);
      return saved;
    } catch (error) {
      if (!isApiError(error, 'edited_meanwhile') || !isKeptThing<Spec>(error.current)) throw error;
      setConflict(error.current);
      return null;
    }
  };

  const theirBase = conflict === null ? null : { id: conflict.id, revisionId: conflict.revision.id };
  return {
    save: (spec) => write(spec, openedBase.current),
    saveOverTheirs: (spec) => write(spec, theirBase ?? openedBase.current),
    saveAsNew: (spec) => write(spec, null),
    acceptTheirs: () => {
      if (conflict === null) return;
      openedBase.current = theirBase;
      queryClient.setQueryData(['accounts', at.accountId, at.collection, 'one', conflict.id], conflict);
      setConflict(null);
    },
    conflict,
    isSaving,
    baseRevisionId: () => openedBase.current?.revisionId ?? null,
  };
}

function isKeptThing<Spec>(value: unknown): value is KeptThing<Spec> {
  return typeof value === 'object' && value !== null && 'id' in value && 'revision' in value;
}
