import type { ReactNode } from 'react';
import { View } from 'react-native';
import { Body, Small } from './text';
import { useTheme } from './theme';
import { HAIRLINE_PX, SPACE } from './tokens';

export type NoticeKind = 'info' | 'caution' | 'error';

export interface NoticeProps {
  kind?: NoticeKind;
  title?: string;
  children?: ReactNode;
  action?: ReactNode;
  /** Read out when it appears. Leave it off for what stands there from the start. */
  isLive?: boolean;
}

/** Told by its edge and its words: a thin edge informs, a thick one cautions, a full frame says that it failed. */
export function Notice({ kind = 'info', title, children, action, isLive = false }: NoticeProps) {
  const { colors } = useTheme();
  const edgePx = { info: 2, caution: 5, error: 5 }[kind];
  const framePx = kind === 'error' ? HAIRLINE_PX : 0;
  return (
    <View
      role={isLive ? (kind === 'error' ? 'alert' : 'status') : undefined}
      style={{
        borderColor: colors.ink,
        borderWidth: framePx,
        borderLeftWidth: edgePx,
        paddingLeft: SPACE.x3,
        paddingVertical: kind === 'error' ? SPACE.x3 : SPACE.x1,
        paddingRight: kind === 'error' ? SPACE.x3 : 0,
        gap: SPACE.x1,
        backgroundColor: kind === 'error' ? colors.sheet : 'transparent',
        minWidth: 0,
      }}
    >
      {title === undefined ? null : <Body weight="semibold">{title}</Body>}
      {typeof children === 'string' ? (
        <Small tone={kind === 'info' ? 'second' : 'ink'}>{children}</Small>
      ) : (
        children
      )}
      {action === undefined ? null : (
        <View style={{ alignItems: 'flex-start', paddingTop: SPACE.x1 }}>{action}</View>
      )}
    </View>
  );
}
