import { useId } from 'react';
import type { ReactNode } from 'react';
import { View } from 'react-native';
import { Heading, Small } from './text';
import { useTheme } from './theme';
import { HAIRLINE_PX, SPACE } from './tokens';

const MARK_PX = 10;

export interface SheetProps {
  title?: string;
  subtitle?: ReactNode;
  action?: ReactNode;
  level?: 2 | 3;
  /** Without inner space: rows and tables that reach the edge. */
  isFlush?: boolean;
  children?: ReactNode;
}

/** A sheet of the drawing: hairline all round, marks at two corners. */
export function Sheet({ title, subtitle, action, level = 2, isFlush = false, children }: SheetProps) {
  const { colors } = useTheme();
  const headingId = useId();
  const hasHead = title !== undefined || action !== undefined;
  return (
    <View
      role={title === undefined ? undefined : 'group'}
      aria-labelledby={title === undefined ? undefined : headingId}
      style={{
        backgroundColor: colors.sheet,
        borderWidth: HAIRLINE_PX,
        borderColor: colors.line,
        paddingVertical: isFlush && !hasHead ? 0 : SPACE.x3,
        paddingBottom: isFlush ? 0 : SPACE.x4,
        paddingHorizontal: isFlush ? 0 : SPACE.x4,
        gap: SPACE.x3,
        minWidth: 0,
      }}
    >
      <CornerMark corner="top-left" />
      <CornerMark corner="bottom-right" />
      {hasHead ? (
        <View
          style={{
            flexDirection: 'row',
            justifyContent: 'space-between',
            alignItems: 'flex-start',
            gap: SPACE.x3,
            paddingHorizontal: isFlush ? SPACE.x4 : 0,
          }}
        >
          <View style={{ flexShrink: 1, gap: 2, minWidth: 0 }}>
            {title === undefined ? null : (
              <Heading id={headingId} level={level}>
                {title}
              </Heading>
            )}
            {typeof subtitle === 'string' ? <Small>{subtitle}</Small> : subtitle}
          </View>
          {action}
        </View>
      ) : null}
      {children}
    </View>
  );
}

function CornerMark({ corner }: { corner: 'top-left' | 'bottom-right' }) {
  const { colors } = useTheme();
  const isTopLeft = corner === 'top-left';
  return (
    <View
      aria-hidden
      style={{
        pointerEvents: 'none',
        position: 'absolute',
        width: MARK_PX,
        height: MARK_PX,
        borderColor: colors.ink,
        ...(isTopLeft
          ? { top: -1, left: -1, borderTopWidth: 2, borderLeftWidth: 2 }
          : { bottom: -1, right: -1, borderBottomWidth: 2, borderRightWidth: 2 }),
      }}
    />
  );
}
