import { useLocalSearchParams } from 'expo-router';
import { useIsWide } from '../../ui';
import { StudiesPanes } from './components/studies-panes';
import { StudyPane } from './components/study-pane';

/** One study: the answer first, then why. */
export function StudyScreen() {
  const { study } = useLocalSearchParams<{ study: string }>();
  const isWide = useIsWide();
  // Another study is another pane: what was chosen in the last one does not carry over.
  if (!isWide) return <StudyPane key={study} studyId={study} />;
  return (
    <StudiesPanes selectedId={study}>
      <StudyPane key={study} studyId={study} />
    </StudiesPanes>
  );
}
