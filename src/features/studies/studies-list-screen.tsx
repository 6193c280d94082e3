import { useInfiniteQuery } from '@tanstack/react-query';
import { hasRole, useAccount } from '../../session';
import { Body, LinkButton, Screen, useIsWide } from '../../ui';
import { StudiesList } from './components/studies-list';
import { StudiesPanes } from './components/studies-panes';
import { StudyPane } from './components/study-pane';
import { studyPlaces } from './study-places';
import { studyQueries } from './study-queries';

/** An engineer's first screen: the studies, each with its answer; on a wide screen the newest opened beside them. */
export function StudiesListScreen() {
  const isWide = useIsWide();
  return isWide ? <WideStudies /> : <PhoneStudies />;
}

function PhoneStudies() {
  const account = useAccount();
  const mayWrite = hasRole(account, ['engineer']);
  return (
    <Screen
      title="Studies"
      action={
        mayWrite ? <LinkButton href={studyPlaces(account).create} label="New study" icon="add" /> : undefined
      }
    >
      <StudiesList />
    </Screen>
  );
}

function WideStudies() {
  const account = useAccount();
  const pages = useInfiniteQuery(studyQueries(account.id).pages());
  const newest = pages.data?.pages[0]?.items[0];
  return (
    <StudiesPanes selectedId={newest?.id}>
      {newest === undefined ? (
        <Screen title="Studies">
          <Body tone="second">The study that you choose at the left opens here.</Body>
        </Screen>
      ) : (
        <StudyPane key={newest.id} studyId={newest.id} documentTitle="Studies" />
      )}
    </StudiesPanes>
  );
}
