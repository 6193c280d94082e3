import { Text as SvgText } from 'react-native-svg';
import { FONTS, SIZES, useTheme } from '../ui';
import type { FontName, Tone } from '../ui';

export interface ChartTextProps {
  x: number;
  /** Base line. */
  y: number;
  children: string;
  anchor?: 'start' | 'middle' | 'end';
  font?: FontName;
  tone?: Tone;
  sizePx?: number;
  /** Degrees about (x, y). */
  turned?: number;
}

/** Words and figures inside a drawing. */
export function ChartText(props: ChartTextProps) {
  const {
    x,
    y,
    children,
    anchor = 'start',
    font = 'mono',
    tone = 'second',
    sizePx = SIZES.label,
    turned,
  } = props;
  const { colors } = useTheme();
  const fill = {
    ink: colors.ink,
    second: colors.inkSecond,
    third: colors.inkThird,
    oxygen: colors.oxygen,
    water: colors.water,
    inverse: colors.sheet,
  }[tone];
  return (
    <SvgText
      x={x}
      y={y}
      fill={fill}
      fontFamily={FONTS[font]}
      fontSize={sizePx}
      textAnchor={anchor}
      transform={turned === undefined ? undefined : `rotate(${turned} ${x} ${y})`}
    >
      {children}
    </SvgText>
  );
}

/** Advance of one figure of the mono face, as a part of its size. */
const MONO_ADVANCE = 0.61;

export function monoWidth(text: string, sizePx: number = SIZES.label): number {
  return text.length * MONO_ADVANCE * sizePx;
}
