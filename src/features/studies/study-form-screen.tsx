import { useQuery } from '@tanstack/react-query';
import { useLocalSearchParams, useRouter } from 'expo-router';
import { useEffect, useState } from 'react';
import type { StudyWithResult } from '../../../shared/contract/studies';
import { describeError } from '../../api/describe-error';
import { isApiError } from '../../api/api-error';
import { useAccount, useDraft } from '../../session';
import { Body, ConflictNotice, FailedState, LoadingState, Notice, Screen, Small, Button } from '../../ui';
import { StudyForm } from './components/study-form';
import {
  NEW_STUDY,
  isStudyDraft,
  studyFormValues,
  studySpec,
  withCreated,
  type StudyDraft,
  type StudyFormValues,
} from './study-form-values';
import { studyPlaces } from './study-places';
import { studyQueries } from './study-queries';
import { useStudySaver } from './use-study-saver';

export function NewStudyScreen() {
  return <StudyFormScreen opened={null} />;
}

export function EditStudyScreen() {
  const account = useAccount();
  const { study: id } = useLocalSearchParams<{ study: string }>();
  const places = studyPlaces(account);
  const study = useQuery(studyQueries(account.id).one(id));
  const back = { href: places.study(id), label: 'Study' };
  if (study.data !== undefined) return <StudyFormScreen key={id} opened={study.data} />;
  return (
    <Screen title="Edit study" back={back}>
      {study.isPending ? <LoadingState what="Fetching the study" /> : null}
      {study.isError && isApiError(study.error, 'not_found') ? (
        <Body>There is no study at this address, or it is not yours to see.</Body>
      ) : null}
      {study.isError && !isApiError(study.error, 'not_found') ? (
        <FailedState
          {...describeError(study.error, 'The study could not be fetched')}
          onRetry={() => void study.refetch()}
          isRetrying={study.isFetching}
        />
      ) : null}
    </Screen>
  );
}

/** A new study, or one that was opened. What is typed is kept on the device until it is saved. */
function StudyFormScreen({ opened }: { opened: StudyWithResult | null }) {
  const account = useAccount();
  const router = useRouter();
  const places = studyPlaces(account);
  const { created } = useLocalSearchParams<{ created?: string }>();
  // What was opened when the form was: a refetch behind it must not change what the save is compared with.
  const [start] = useState(opened);
  const fresh: StudyDraft = {
    values: start === null ? NEW_STUDY : studyFormValues(start.revision.spec),
    baseRevisionId: start?.revision.id ?? null,
  };
  const [initialDraft] = useState(fresh);
  const draft = useDraft(start === null ? 'study' : `study/${start.id}`, initialDraft, isStudyDraft);
  // The revision that the typing began from decides whether somebody else was faster, also after a reload.
  const [baseRevisionId, setBaseRevisionId] = useState(draft.content.baseRevisionId);
  const saver = useStudySaver(
    account.id,
    start === null || baseRevisionId === null ? null : { studyId: start.id, revisionId: baseRevisionId },
  );
  const [form, setForm] = useState(() => ({
    version: 0,
    values: withCreated(draft.content.values, created),
  }));
  // Who comes back from making a part of the question knows that the rest was kept.
  const [isRestored, setIsRestored] = useState(draft.isRestored && created === undefined);
  const [isOverwriting, setIsOverwriting] = useState(false);
  const [overwriteError, setOverwriteError] = useState<unknown>(null);

  useEffect(() => {
    if (created === undefined) return;
    // Kept at once, so that a second trip to another form brings both back; and not chosen again by a reload.
    draft.save({ values: form.values, baseRevisionId });
    router.setParams({ created: undefined });
  }, [created, draft, form.values, baseRevisionId, router]);

  const refill = (values: StudyFormValues) => setForm((before) => ({ version: before.version + 1, values }));
  const leaveFor = (id: string | null) => {
    if (id === null) return;
    draft.clear();
    router.replace(places.study(id));
  };
  const saveMine = async () => {
    setIsOverwriting(true);
    setOverwriteError(null);
    try {
      leaveFor(await saver.saveOverTheirs(studySpec(draft.content.values)));
    } catch (error) {
      setOverwriteError(error);
    } finally {
      setIsOverwriting(false);
    }
  };
  const takeTheirs = () => {
    if (saver.conflict === null) return;
    saver.dismissConflict();
    setBaseRevisionId(saver.conflict.revision.id);
    draft.clear();
    refill(studyFormValues(saver.conflict.revision.spec));
  };

  return (
    <Screen
      title={start === null ? 'New study' : 'Edit study'}
      subtitle={
        start === null ? 'How many days does one food keep, and what ends it?' : start.revision.spec.name
      }
      back={
        start === null
          ? { href: places.list, label: 'Studies' }
          : { href: places.study(start.id), label: 'Study' }
      }
    >
      {isRestored ? (
        <Notice
          action={
            <Button
              label={start === null ? 'Start from nothing' : 'Start from what is saved'}
              onPress={() => {
                draft.clear();
                setIsRestored(false);
                setBaseRevisionId(initialDraft.baseRevisionId);
                refill(initialDraft.values);
              }}
            />
          }
        >
          <Small>What you typed here last is still there.</Small>
        </Notice>
      ) : null}
      {saver.conflict === null ? null : (
        <ConflictNotice
          what="This study"
          onKeepMine={() => void saveMine()}
          onTakeTheirs={takeTheirs}
          isBusy={isOverwriting}
        >
          <Small tone="ink">{`The newer state is called “${saver.conflict.revision.spec.name}”.`}</Small>
          {overwriteError === null ? null : (
            <Small tone="ink">{describeError(overwriteError, 'It could not be saved').message}</Small>
          )}
        </ConflictNotice>
      )}
      <StudyForm
        key={form.version}
        initialValues={form.values}
        returnTo={start === null ? places.create : places.edit(start.id)}
        submitLabel={start === null ? 'Compute and keep' : 'Save and compute'}
        onChange={(values) => draft.save({ values, baseRevisionId })}
        onSubmit={async (values) => leaveFor(await saver.save(studySpec(values)))}
      />
    </Screen>
  );
}
