import { useRouter } from 'expo-router';
import { useState } from 'react';
import type { Collection, KeptThing } from '../../../shared/contract/kept-things';
import { describeError, type ErrorWords } from '../describe-error';
import type { SpecByCollection } from '../kept-things-queries';
import { addressAfterCreating } from './return-address';
import { useKeptThingSaver } from './use-kept-thing-saver';

export interface KeptThingFormOptions<Name extends Collection> {
  accountId: string;
  /** '/a/<slug>' */
  basePath: string;
  collection: Name;
  opened: KeptThing<SpecByCollection[Name]> | null;
  returnTo: string | undefined;
  /** What was left unsaved: the revision it was typed on, and how to drop it once it is saved or given up. */
  draft: { baseRevisionId: string | null; clear: () => void };
}

export interface KeptThingFormState<Spec> {
  /** For the form's onSubmit; what the server refused is thrown for its fields. */
  submit: (spec: Spec) => Promise<void>;
  conflict: KeptThing<Spec> | null;
  keepMine: (spec: Spec) => void;
  saveAsNew: (spec: Spec) => void;
  takeTheirs: () => KeptThing<Spec> | null;
  isSaving: boolean;
  fault: ErrorWords | null;
  /** 'Saved as revision 3.' until the next change. */
  said: string;
  /** What the next save is built on. */
  baseRevisionId: () => string | null;
}

/** A path of the request's body as a path of the form. */
export function specFieldName(path: string): string {
  return path.replace(/^spec\./, '');
}

/** Creating and revising one kept thing from a form: where it goes afterwards, and what happens on a lost race. */
export function useKeptThingForm<Name extends Collection>(
  options: KeptThingFormOptions<Name>,
): KeptThingFormState<SpecByCollection[Name]> {
  type Spec = SpecByCollection[Name];
  const { accountId, basePath, collection, opened, returnTo, draft } = options;
  const router = useRouter();
  const saver = useKeptThingSaver(
    { accountId, collection },
    opened === null ? null : { id: opened.id, revisionId: draft.baseRevisionId ?? opened.revision.id },
  );
  const [said, setSaid] = useState('');
  const [fault, setFault] = useState<ErrorWords | null>(null);

  const finish = (saved: KeptThing<Spec> | null) => {
    if (saved === null) return;
    draft.clear();
    if (saved.id === opened?.id) {
      setSaid(`Saved as revision ${saved.revision.number}.`);
      return;
    }
    const place = collection === 'laminates' ? 'walls' : collection;
    const otherwise = `${basePath}/${place}/${saved.id}`;
    router.replace(addressAfterCreating({ collection, id: saved.id }, { returnTo, basePath, otherwise }));
  };
  const settle = (saving: Promise<KeptThing<Spec> | null>) => {
    setFault(null);
    saving.then(finish, (error: unknown) => setFault(describeError(error, 'It could not be saved')));
  };

  return {
    submit: async (spec) => {
      setSaid('');
      finish(await saver.save(spec));
    },
    conflict: saver.conflict,
    keepMine: (spec) => settle(saver.saveOverTheirs(spec)),
    saveAsNew: (spec) => settle(saver.saveAsNew(spec)),
    takeTheirs: () => {
      const theirs = saver.conflict;
      saver.acceptTheirs();
      draft.clear();
      return theirs;
    },
    isSaving: saver.isSaving,
    fault,
    said,
    baseRevisionId: saver.baseRevisionId,
  };
}
