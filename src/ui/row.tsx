import type { ReactNode } from 'react';
import { Pressable, View } from 'react-native';
import type { ViewStyle } from 'react-native';
import { Icon } from './icon';
import { useAnchorClick } from './navigation';
import { Body, Small } from './text';
import { useTheme } from './theme';
import { HAIRLINE_PX, ROW_MIN_PX, SPACE } from './tokens';

const CURRENT_MARK_PX = 3;

export interface RowProps {
  label: string;
  /** Smaller, under the label. */
  detail?: ReactNode;
  /** At the right end: a figure, a word, a control. */
  value?: ReactNode;
  href?: string;
  onPress?: () => void;
  isCurrent?: boolean;
  /** No line under it: the last of a group. */
  isLast?: boolean;
}

/** One line of a list: at least a finger high, ruled below, the whole of it pressable when it leads somewhere. */
export function Row({ label, detail, value, href, onPress, isCurrent = false, isLast = false }: RowProps) {
  const { colors } = useTheme();
  const onClick = useAnchorClick(href ?? '');
  const content = (
    <>
      <View style={{ flexShrink: 1, flexGrow: 1, minWidth: 0, gap: 2 }}>
        <Body weight={href === undefined ? 'regular' : 'medium'}>{label}</Body>
        {typeof detail === 'string' ? <Small>{detail}</Small> : detail}
      </View>
      {typeof value === 'string' ? <Small>{value}</Small> : value}
      {href === undefined ? null : <Icon name="forward" sizePx={14} color={colors.inkThird} />}
    </>
  );
  const isStill = href === undefined && onPress === undefined;
  const style: ViewStyle = {
    minHeight: ROW_MIN_PX,
    flexDirection: 'row',
    alignItems: 'center',
    gap: SPACE.x3,
    paddingVertical: SPACE.x2,
    paddingRight: isStill ? 0 : SPACE.x2,
    // The mark of the current row takes its width from the space beside the words, so that they stay aligned.
    paddingLeft: isStill ? 0 : SPACE.x2 - (isCurrent ? CURRENT_MARK_PX : 0),
    marginHorizontal: isStill ? 0 : -SPACE.x2,
    borderBottomWidth: isLast ? 0 : HAIRLINE_PX,
    borderBottomColor: colors.lineFaint,
    borderLeftWidth: isCurrent ? CURRENT_MARK_PX : 0,
    borderLeftColor: colors.ink,
  };
  if (href !== undefined) {
    return (
      <View href={href} onClick={onClick} aria-current={isCurrent ? 'page' : undefined} style={style}>
        {content}
      </View>
    );
  }
  if (onPress !== undefined) {
    return (
      <Pressable
        role="button"
        onPress={onPress}
        style={({ hovered, pressed }) => [
          style,
          (hovered || pressed) && { backgroundColor: colors.lineFaint },
        ]}
      >
        {content}
      </Pressable>
    );
  }
  return <View style={style}>{content}</View>;
}
