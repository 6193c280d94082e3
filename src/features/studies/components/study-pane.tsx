import { useQuery } from '@tanstack/react-query';
import { describeError } from '../../../api/describe-error';
import { isApiError } from '../../../api/api-error';
import { hasRole, useAccount } from '../../../session';
import { Body, FailedState, LinkButton, LoadingState, Screen, useIsWide } from '../../../ui';
import type { StudyWithResult } from '../../../../shared/contract/studies';
import { studyPlaces } from '../study-places';
import { studyQueries } from '../study-queries';
import { QuestionStrip } from './question-strip';
import { RunAgain } from './run-again';
import { StudyAnswer } from './study-answer';

export interface StudyPaneProps {
  studyId: string;
  documentTitle?: string;
}

/** A study by its id: its question, then its answer, in every state of fetching. */
export function StudyPane({ studyId, documentTitle }: StudyPaneProps) {
  const account = useAccount();
  const isWide = useIsWide();
  const places = studyPlaces(account);
  const query = useQuery(studyQueries(account.id).one(studyId));
  const back = isWide ? undefined : { href: places.list, label: 'Studies' };

  if (query.isPending) {
    return (
      <Screen title="Study" back={back} documentTitle={documentTitle}>
        <LoadingState what="Fetching the study" />
      </Screen>
    );
  }
  if (query.data === undefined) {
    const isGone = isApiError(query.error, 'not_found');
    return (
      <Screen title={isGone ? 'No such study' : 'Study'} back={back} documentTitle={documentTitle}>
        {isGone ? (
          <Body>There is no study at this address, or it is not yours to see. Choose one from the list.</Body>
        ) : (
          <FailedState
            {...describeError(query.error, 'The study could not be fetched')}
            onRetry={() => void query.refetch()}
            isRetrying={query.isFetching}
          />
        )}
      </Screen>
    );
  }
  return <FetchedStudy study={query.data} back={back} documentTitle={documentTitle} />;
}

interface FetchedStudyProps {
  study: StudyWithResult;
  back: { href: string; label: string } | undefined;
  documentTitle: string | undefined;
}

function FetchedStudy({ study, back, documentTitle }: FetchedStudyProps) {
  const account = useAccount();
  const places = studyPlaces(account);
  const mayWrite = hasRole(account, ['engineer']);
  return (
    <Screen
      title={study.revision.spec.name}
      back={back}
      documentTitle={documentTitle}
      width="wide"
      action={mayWrite ? <LinkButton href={places.edit(study.id)} label="Edit study" /> : undefined}
    >
      <QuestionStrip study={study} />
      {mayWrite && (study.is_outdated || study.latest_result === null) ? <RunAgain study={study} /> : null}
      {study.latest_result === null ? null : <StudyAnswer study={study} result={study.latest_result} />}
    </Screen>
  );
}
