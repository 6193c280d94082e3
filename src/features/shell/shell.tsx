import type { ReactNode } from 'react';
import { Text, View } from 'react-native';
import { useAccount } from '../../session';
import { FONTS, HAIRLINE_PX, SPACE, Small, TITLE_LINE_HEIGHT, useIsWide, useTheme } from '../../ui';
import { BottomBar } from './components/bottom-bar';
import { SideRail } from './components/side-rail';
import { placeOfPath } from './places';

const RAIL_WIDTH_PX = 200;
const BAR_HEIGHT_PX = 60;

export interface ShellProps {
  pathname: string;
  children: ReactNode;
}

/** What stands round every screen of an account: a bar under the thumb, or a rail at the side where there is room. */
export function Shell({ pathname, children }: ShellProps) {
  const isWide = useIsWide();
  return isWide ? (
    <WideShell pathname={pathname}>{children}</WideShell>
  ) : (
    <PhoneShell pathname={pathname}>{children}</PhoneShell>
  );
}

function PhoneShell({ pathname, children }: ShellProps) {
  const { colors } = useTheme();
  return (
    <View style={{ flexGrow: 1, minWidth: 0 }}>
      <SkipLink />
      <Main>
        <View style={{ paddingBottom: BAR_HEIGHT_PX }}>{children}</View>
      </Main>
      <View
        className="not-in-print"
        style={{
          position: 'fixed',
          left: 0,
          right: 0,
          bottom: 0,
          minHeight: BAR_HEIGHT_PX,
          zIndex: 5,
          backgroundColor: colors.sheet,
          borderTopWidth: HAIRLINE_PX,
          borderTopColor: colors.line,
        }}
      >
        <BottomBar current={placeOfPath(pathname)} />
      </View>
    </View>
  );
}

function WideShell({ pathname, children }: ShellProps) {
  const { colors } = useTheme();
  const account = useAccount();
  return (
    <View style={{ flexGrow: 1, flexDirection: 'row', minWidth: 0 }}>
      <SkipLink />
      <View
        className="not-in-print"
        style={{
          width: RAIL_WIDTH_PX,
          flexShrink: 0,
          borderRightWidth: HAIRLINE_PX,
          borderRightColor: colors.line,
        }}
      >
        <View style={{ position: 'sticky', top: 0, paddingVertical: SPACE.x6, gap: SPACE.x6 }}>
          <View role="banner" style={{ paddingHorizontal: SPACE.x4, gap: 2 }}>
            <Text
              style={{
                fontFamily: FONTS.semibold,
                fontSize: 21,
                lineHeight: Math.round(21 * TITLE_LINE_HEIGHT),
                color: colors.ink,
              }}
            >
              Larderline
            </Text>
            <Small>{account.name}</Small>
          </View>
          <SideRail current={placeOfPath(pathname)} />
        </View>
      </View>
      <Main>{children}</Main>
    </View>
  );
}

function Main({ children }: { children: ReactNode }) {
  return (
    <main
      id="main"
      tabIndex={-1}
      style={{ display: 'flex', flexDirection: 'column', flexGrow: 1, flexBasis: 0, minWidth: 0 }}
    >
      {children}
    </main>
  );
}

function SkipLink() {
  return (
    <a
      className="skip-link"
      href="#main"
      onClick={(event) => {
        event.preventDefault();
        document.getElementById('main')?.focus();
      }}
    >
      Skip to the content
    </a>
  );
}
