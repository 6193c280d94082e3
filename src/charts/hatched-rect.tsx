import { Path, Rect } from 'react-native-svg';
import { useTheme } from '../ui';
import { hatchMarks } from '../../shared/charts/hatching';
import type { ChartRect, Hatch } from '../../shared/charts/hatching';

export interface HatchedRectProps {
  rect: ChartRect;
  hatch: Hatch;
  /** Below 1 for cards. */
  scale?: number;
}

/** One layer's cut face: outline and hatch in ink. */
export function HatchedRect({ rect, hatch, scale = 1 }: HatchedRectProps) {
  const { colors } = useTheme();
  const marks = hatchMarks(hatch, rect, scale);
  const fill = { none: colors.sheet, ink: colors.ink, second: colors.inkThird, tint: colors.lineFaint }[
    marks.fill
  ];
  return (
    <>
      <Rect {...rect} fill={fill} />
      {marks.lines === '' ? null : <Path d={marks.lines} stroke={colors.ink} strokeWidth={0.8} fill="none" />}
      {marks.dots === '' ? null : <Path d={marks.dots} fill={colors.ink} />}
      <Rect {...rect} fill="none" stroke={colors.ink} strokeWidth={1} />
    </>
  );
}
