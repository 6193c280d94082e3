import type { CSSProperties, ReactNode } from 'react';
import { View } from 'react-native';
import { hasRole, useAccount } from '../../../session';
import { HAIRLINE_PX, Heading, LinkButton, SPACE, useTheme } from '../../../ui';
import { studyPlaces } from '../study-places';
import { StudiesList } from './studies-list';

const LIST_WIDTH_PX = 316;

/** Stays in sight beside a long study and scrolls by itself when the list is longer than the screen. */
const LIST_STYLE: CSSProperties = {
  position: 'sticky',
  top: 0,
  maxHeight: '100dvh',
  overflowY: 'auto',
  boxSizing: 'border-box',
  display: 'flex',
  flexDirection: 'column',
  gap: SPACE.x3,
  padding: `${SPACE.x5}px ${SPACE.x3}px ${SPACE.x3}px`,
};

/** On a wide screen: the list at the left, the study beside it. */
export function StudiesPanes({ selectedId, children }: { selectedId?: string; children: ReactNode }) {
  const { colors } = useTheme();
  const account = useAccount();
  return (
    <View style={{ flexDirection: 'row', flexGrow: 1, minWidth: 0 }}>
      <View
        role="navigation"
        aria-label="Studies"
        className="not-in-print"
        style={{
          width: LIST_WIDTH_PX,
          flexShrink: 0,
          borderRightWidth: HAIRLINE_PX,
          borderRightColor: colors.line,
        }}
      >
        <div style={LIST_STYLE}>
          <View style={{ flexDirection: 'row', justifyContent: 'space-between', alignItems: 'center' }}>
            <Heading>Studies</Heading>
            {hasRole(account, ['engineer']) ? (
              <LinkButton href={studyPlaces(account).create} label="New study" icon="add" />
            ) : null}
          </View>
          <StudiesList selectedId={selectedId} />
        </div>
      </View>
      <View style={{ flexGrow: 1, flexShrink: 1, flexBasis: 0, minWidth: 0 }}>{children}</View>
    </View>
  );
}
