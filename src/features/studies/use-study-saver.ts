import { useQueryClient } from '@tanstack/react-query';
import { useRef, useState } from 'react';
import type { Study, StudySpec } from '../../../shared/contract/studies';
import { isApiError } from '../../api/api-error';
import { useIdempotencyKey } from '../../api/use-idempotency-key';
import { createStudy, refreshStudy, reviseStudy } from './study-queries';

export interface StudyBase {
  studyId: string;
  revisionId: string;
}

export interface StudySaver {
  /** Resolves to the id; to null where somebody else saved meanwhile: `conflict` then holds their state. */
  save: (spec: StudySpec) => Promise<string | null>;
  /** The same on top of the state that won the race. */
  saveOverTheirs: (spec: StudySpec) => Promise<string | null>;
  conflict: Pick<Study, 'id' | 'revision'> | null;
  /** Once the caller goes on from their state. */
  dismissConflict: () => void;
}

/** Creates a study, or revises the one that was opened. A second call while one is under way joins it. */
export function useStudySaver(accountId: string, base: StudyBase | null): StudySaver {
  const queryClient = useQueryClient();
  const idempotency = useIdempotencyKey();
  const underWay = useRef<Promise<string | null> | null>(null);
  const [conflict, setConflict] = useState<StudySaver['conflict']>(null);

  const run = async (spec: StudySpec, target: StudyBase | null): Promise<string | null> => {
    try {
      const saved =
        target === null
          ? await createStudy(accountId, spec, idempotency.keyFor(spec))
          : await reviseStudy(
              { accountId, studyId: target.studyId, baseRevisionId: target.revisionId },
              spec,
            );
      idempotency.renew();
      setConflict(null);
      await refreshStudy(queryClient, accountId, saved.id);
      return saved.id;
    } catch (error) {
      if (!isApiError(error, 'edited_meanwhile') || !isStudy(error.current)) throw error;
      setConflict(error.current);
      return null;
    }
  };

  const write = (spec: StudySpec, target: StudyBase | null) => {
    underWay.current ??= run(spec, target).finally(() => {
      underWay.current = null;
    });
    return underWay.current;
  };

  const theirs = conflict === null ? null : { studyId: conflict.id, revisionId: conflict.revision.id };
  return {
    save: (spec) => write(spec, base),
    saveOverTheirs: (spec) => write(spec, theirs ?? base),
    conflict,
    dismissConflict: () => setConflict(null),
  };
}

function isStudy(value: unknown): value is Pick<Study, 'id' | 'revision'> {
  return typeof value === 'object' && value !== null && 'id' in value && 'revision' in value;
}
