import type { ReactNode } from 'react';
import { Text } from 'react-native';
import type { TextStyle } from 'react-native';
import { useTheme } from './theme';
import { FONTS, SIZES, TEXT_LINE_HEIGHT, TITLE_LINE_HEIGHT } from './tokens';
import type { Colors, FontName } from './tokens';
import { useIsWide } from './use-is-wide';

/** The two hues are for the two gases alone. */
export type Tone = 'ink' | 'second' | 'third' | 'oxygen' | 'water' | 'inverse';

export interface TextPartProps {
  children: ReactNode;
  tone?: Tone;
  weight?: 'regular' | 'medium' | 'semibold';
  align?: 'left' | 'center' | 'right';
  id?: string;
  /** Headings only: 2 unless told. */
  level?: 2 | 3 | 4;
}

export function toneColor(colors: Colors, tone: Tone): string {
  const byTone: Record<Tone, string> = {
    ink: colors.ink,
    second: colors.inkSecond,
    third: colors.inkThird,
    oxygen: colors.oxygen,
    water: colors.water,
    inverse: colors.sheet,
  };
  return byTone[tone];
}

export function textStyle(font: FontName, sizePx: number, lineHeight: number): TextStyle {
  return { fontFamily: FONTS[font], fontSize: sizePx, lineHeight: Math.round(sizePx * lineHeight) };
}

/** The one heading of level 1 on a screen. */
export function Title({ children, tone = 'ink', id }: TextPartProps) {
  const { colors } = useTheme();
  const isWide = useIsWide();
  const sizePx = isWide ? SIZES.display : SIZES.title;
  return (
    <Text
      id={id}
      role="heading"
      aria-level={1}
      tabIndex={-1}
      style={[
        textStyle('semibold', sizePx, TITLE_LINE_HEIGHT),
        { color: toneColor(colors, tone), letterSpacing: -0.2, overflowWrap: 'anywhere' },
      ]}
    >
      {children}
    </Text>
  );
}

export function Heading({ children, tone = 'ink', align, id, level = 2 }: TextPartProps) {
  const { colors } = useTheme();
  return (
    <Text
      id={id}
      role="heading"
      aria-level={level}
      style={[
        textStyle('semibold', SIZES.heading, TITLE_LINE_HEIGHT),
        { color: toneColor(colors, tone), textAlign: align, overflowWrap: 'anywhere' },
      ]}
    >
      {children}
    </Text>
  );
}

export function Body({ children, tone = 'ink', weight = 'regular', align, id }: TextPartProps) {
  const { colors } = useTheme();
  return (
    <Text
      id={id}
      style={[
        textStyle(weight, SIZES.body, TEXT_LINE_HEIGHT),
        { color: toneColor(colors, tone), textAlign: align, overflowWrap: 'break-word' },
      ]}
    >
      {children}
    </Text>
  );
}

export function Small({ children, tone = 'second', weight = 'regular', align, id }: TextPartProps) {
  const { colors } = useTheme();
  return (
    <Text
      id={id}
      style={[
        textStyle(weight, SIZES.small, TEXT_LINE_HEIGHT),
        { color: toneColor(colors, tone), textAlign: align, overflowWrap: 'break-word' },
      ]}
    >
      {children}
    </Text>
  );
}

/** The small word above a value. */
export function Label({ children, tone = 'third', weight = 'regular', align, id }: TextPartProps) {
  const { colors } = useTheme();
  return (
    <Text
      id={id}
      style={[
        textStyle(weight, SIZES.label, TEXT_LINE_HEIGHT),
        { color: toneColor(colors, tone), textAlign: align },
      ]}
    >
      {children}
    </Text>
  );
}
