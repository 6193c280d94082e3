import type { ReactNode } from 'react';
import { Text } from 'react-native';
import { useAnchorClick } from './navigation';
import { textStyle, toneColor } from './text';
import type { Tone } from './text';
import { useTheme } from './theme';
import { SIZES, TEXT_LINE_HEIGHT } from './tokens';

export interface LinkProps {
  href: string;
  children: ReactNode;
  tone?: Tone;
  weight?: 'regular' | 'medium' | 'semibold';
  size?: 'small' | 'body' | 'heading';
  /** Without the line under it: in menus and rows, where the place says that it is a link. */
  isQuiet?: boolean;
  /** Pads to a finger's height; leave it off inside a sentence. */
  isStandalone?: boolean;
}

export function Link(props: LinkProps) {
  const { href, children, tone = 'ink', weight = 'medium', size = 'body', isQuiet = false } = props;
  const { colors } = useTheme();
  const onClick = useAnchorClick(href);
  return (
    <Text
      href={href}
      onClick={onClick}
      className={isQuiet ? 'hover-underline' : undefined}
      style={[
        textStyle(weight, SIZES[size], TEXT_LINE_HEIGHT),
        { color: toneColor(colors, tone), textDecorationLine: isQuiet ? undefined : 'underline' },
        props.isStandalone === true && { paddingVertical: 12, alignSelf: 'flex-start' },
      ]}
    >
      {children}
    </Text>
  );
}
