import { Screen } from '../../ui';
import { ActingParts } from './components/acting-parts';
import { EnteringParts } from './components/entering-parts';
import { LayoutParts } from './components/layout-parts';
import { TableParts } from './components/table-parts';
import { TellingParts } from './components/telling-parts';
import { WordParts } from './components/word-parts';

/** Every part in every state, in both schemes; the browser tests photograph this page. */
export function GalleryScreen() {
  return (
    <main style={{ display: 'flex', flexDirection: 'column' }}>
      <Screen title="Gallery" subtitle="Every part in every state, light and dark." width="wide">
        <WordParts />
        <LayoutParts />
        <ActingParts />
        <EnteringParts />
        <TableParts />
        <TellingParts />
      </Screen>
    </main>
  );
}
