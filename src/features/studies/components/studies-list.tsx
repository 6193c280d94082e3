import { useInfiniteQuery } from '@tanstack/react-query';
import { View } from 'react-native';
import { describeError } from '../../../api/describe-error';
import { hasRole, useAccount } from '../../../session';
import { Button, EmptyState, FailedState, LinkButton, LoadingState, SPACE } from '../../../ui';
import { studyPlaces } from '../study-places';
import { studyQueries } from '../study-queries';
import { StudyCard } from './study-card';

/** Newest first, more on demand; every state of it. */
export function StudiesList({ selectedId }: { selectedId?: string }) {
  const account = useAccount();
  const places = studyPlaces(account);
  const pages = useInfiniteQuery(studyQueries(account.id).pages());

  if (pages.isPending) return <LoadingState what="Fetching the studies" />;
  if (pages.isError && pages.data === undefined) {
    return (
      <FailedState
        {...describeError(pages.error, 'The studies could not be fetched')}
        onRetry={() => void pages.refetch()}
        isRetrying={pages.isFetching}
      />
    );
  }
  const studies = pages.data.pages.flatMap((page) => page.items);
  if (studies.length === 0) {
    const mayWrite = hasRole(account, ['engineer']);
    return (
      <EmptyState
        title="No study yet"
        action={
          mayWrite ? (
            <LinkButton href={places.create} label="Start the first study" kind="primary" icon="add" />
          ) : undefined
        }
      >
        {mayWrite
          ? 'A study asks how many days one food keeps in one wall, in one pack, on one route. Its answer will stand here.'
          : 'When an engineer of this account makes a study, its answer will stand here.'}
      </EmptyState>
    );
  }
  return (
    <View style={{ gap: SPACE.x3 }}>
      <View role="list" aria-label="Studies, newest first" style={{ gap: SPACE.x2 }}>
        {studies.map((study) => (
          <View key={study.id} role="listitem">
            <StudyCard study={study} href={places.study(study.id)} isCurrent={study.id === selectedId} />
          </View>
        ))}
      </View>
      {pages.isFetchNextPageError ? (
        <FailedState
          {...describeError(pages.error, 'The next studies could not be fetched')}
          onRetry={() => void pages.fetchNextPage()}
          isRetrying={pages.isFetchingNextPage}
        />
      ) : null}
      {pages.hasNextPage && !pages.isFetchNextPageError ? (
        <Button
          label="Show more studies"
          onPress={() => void pages.fetchNextPage()}
          isBusy={pages.isFetchingNextPage}
          busyLabel="Fetching…"
        />
      ) : null}
    </View>
  );
}
