import { useEffect, useId } from 'react';
import type { ReactNode } from 'react';
import { View } from 'react-native';
import { Icon } from './icon';
import { useAnchorClick } from './navigation';
import { usePageTitle } from './page-title';
import { Body, Small, Title } from './text';
import { useTheme } from './theme';
import { ROW_MIN_PX, SPACE } from './tokens';
import { useIsWide } from './use-is-wide';

const MAX_WIDTH_PX = { narrow: 480, pair: 920, text: 720, wide: 1240 } as const;
/** Outside any account there is no rail, and these stand in the middle. */
const CENTRED = new Set(['narrow', 'pair']);

export interface ScreenProps {
  title: string;
  /** One line under the title. */
  subtitle?: ReactNode;
  back?: { href: string; label: string };
  /** One action at the top right: a link or a quiet button. */
  action?: ReactNode;
  width?: keyof typeof MAX_WIDTH_PX | 'full';
  /** For the browser's tab, where the title alone would not say enough. */
  documentTitle?: string;
  children: ReactNode;
}

/** A whole screen: where one came from, its name as the heading of level 1, one action, the content. */
export function Screen({
  title,
  subtitle,
  back,
  action,
  width = 'text',
  documentTitle,
  children,
}: ScreenProps) {
  const isWide = useIsWide();
  const titleId = useId();
  usePageTitle(documentTitle ?? title);
  useArrival(titleId);
  const hasTopLine = back !== undefined || (action !== undefined && !isWide);
  return (
    <View
      style={{
        width: '100%',
        maxWidth: width === 'full' ? undefined : MAX_WIDTH_PX[width],
        alignSelf: isWide && !CENTRED.has(width) ? 'flex-start' : 'center',
        paddingHorizontal: isWide ? SPACE.x6 : SPACE.x4,
        paddingTop: hasTopLine ? SPACE.x2 : SPACE.x5,
        paddingBottom: SPACE.x8,
        gap: SPACE.x3,
      }}
    >
      {hasTopLine ? (
        <View
          style={{
            flexDirection: 'row',
            justifyContent: 'space-between',
            alignItems: 'center',
            gap: SPACE.x3,
          }}
        >
          {back === undefined ? <View /> : <BackLink href={back.href} label={back.label} />}
          {isWide ? null : action}
        </View>
      ) : null}
      <View
        style={{
          flexDirection: 'row',
          justifyContent: 'space-between',
          alignItems: 'flex-start',
          gap: SPACE.x4,
        }}
      >
        <View style={{ flexShrink: 1, minWidth: 0, gap: SPACE.x1, paddingBottom: SPACE.x1 }}>
          <Title id={titleId}>{title}</Title>
          {typeof subtitle === 'string' ? <Body tone="second">{subtitle}</Body> : subtitle}
        </View>
        {isWide ? action : null}
      </View>
      <View style={{ gap: SPACE.x4, minWidth: 0 }}>{children}</View>
    </View>
  );
}

function BackLink({ href, label }: { href: string; label: string }) {
  const { colors } = useTheme();
  const onClick = useAnchorClick(href);
  return (
    <View
      href={href}
      onClick={onClick}
      className="hover-underline"
      style={{
        minHeight: ROW_MIN_PX,
        flexDirection: 'row',
        alignItems: 'center',
        gap: SPACE.x1,
        flexShrink: 1,
        paddingRight: SPACE.x3,
        marginLeft: -SPACE.x1,
      }}
    >
      <Icon name="back" sizePx={14} color={colors.inkSecond} />
      <Small>{label}</Small>
    </View>
  );
}

/** What the last screen to appear found: its address, and whether it took the focus. */
let lastArrival: { path: string; takesFocus: boolean } | null = null;
let hasGoneBack = false;
if (typeof window !== 'undefined') {
  window.addEventListener('popstate', () => {
    hasGoneBack = true;
  });
}

/**
 * A page that is exchanged without loading keeps its scroll position and loses its focus with what was pressed. A
 * screen at a new address begins at its top and readers begin at its heading; going back is left to the browser. A
 * screen that takes the place of its own loading state goes on as that began.
 */
function useArrival(titleId: string): void {
  useEffect(() => {
    const path = window.location.pathname;
    const isNewPlace = lastArrival !== null && lastArrival.path !== path;
    const takesFocus = isNewPlace ? !hasGoneBack : (lastArrival?.takesFocus ?? false);
    lastArrival = { path, takesFocus };
    hasGoneBack = false;
    if (!takesFocus) return;
    if (isNewPlace) window.scrollTo(0, 0);
    const isFocusFree = document.activeElement === null || document.activeElement === document.body;
    if (isFocusFree) document.getElementById(titleId)?.focus({ preventScroll: true });
  }, [titleId]);
}
