import { Text } from 'react-native';
import { textStyle, toneColor } from './text';
import type { Tone } from './text';
import { useTheme } from './theme';
import { SIZES, TITLE_LINE_HEIGHT } from './tokens';

export interface FigureProps {
  /** Already formatted. */
  value: string;
  unit?: string;
  size?: 'label' | 'small' | 'body' | 'title' | 'display';
  tone?: Tone;
  isStrong?: boolean;
  align?: 'left' | 'right';
}

/** A number in the mono face with its unit beside it, so that columns align and digits do not jump. */
export function Figure({ value, unit, size = 'body', tone = 'ink', isStrong = false, align }: FigureProps) {
  const { colors } = useTheme();
  const sizePx = SIZES[size];
  return (
    <Text
      style={[
        textStyle(isStrong ? 'monoMedium' : 'mono', sizePx, TITLE_LINE_HEIGHT),
        { color: toneColor(colors, tone), textAlign: align, fontVariant: ['tabular-nums'] },
      ]}
    >
      {value}
      {unit === undefined || unit === '' ? null : (
        <Text
          style={[
            textStyle('regular', unitSizePx(sizePx), TITLE_LINE_HEIGHT),
            {
              color: tone === 'ink' ? colors.inkSecond : toneColor(colors, tone),
              paddingLeft: Math.round(sizePx * 0.14),
              // Kerning pushes the raised dots of m²·day·atm into their neighbours.
              fontFeatureSettings: '"kern" 0',
            },
          ]}
        >
          {`\u00A0${unit}`}
        </Text>
      )}
    </Text>
  );
}

/** One step down the scale, so that the number leads. */
function unitSizePx(figureSizePx: number): number {
  if (figureSizePx <= SIZES.small) return figureSizePx;
  return figureSizePx >= SIZES.title ? SIZES.body : SIZES.small;
}
