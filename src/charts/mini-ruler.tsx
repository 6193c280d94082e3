import { useTheme } from '../ui';
import Svg, { Line, Path, Rect } from 'react-native-svg';
import { layoutDaysRuler } from '../../shared/charts/days-ruler';

export interface MiniRulerProps {
  /** null: no limit is reached. */
  days: number | null;
  targetDays: number;
  gas: 'oxygen' | 'water' | null;
  width?: number;
}

const HEIGHT_PX = 14;

/** Days against the target on a card, beside the words that say the same, so readers do not hear it. */
export function MiniRuler({ days, targetDays, gas, width = 112 }: MiniRulerProps) {
  const { colors } = useTheme();
  const { bars, target } = layoutDaysRuler([{ id: 'one', days }], targetDays, width - 6);
  const bar = bars[0];
  const ink = gas === null ? colors.inkSecond : gas === 'oxygen' ? colors.oxygen : colors.water;
  if (bar === undefined) return null;
  const x = Math.max(2, bar.x);
  return (
    <Svg width={width} height={HEIGHT_PX} aria-hidden>
      <Line x1={0} x2={width - 6} y1={HEIGHT_PX / 2} y2={HEIGHT_PX / 2} stroke={colors.line} />
      {bar.isOpenEnded ? (
        <Path d={`M0 4H${x - 2}V2L${x + 4} 7L${x - 2} 12V10H0Z`} fill={ink} />
      ) : (
        <Rect
          x={0.75}
          y={4}
          width={Math.max(1, x - 1.5)}
          height={6}
          fill={bar.isMet ? ink : colors.sheet}
          stroke={ink}
          strokeWidth={1.5}
        />
      )}
      <Line x1={target.x} x2={target.x} y1={0} y2={HEIGHT_PX} stroke={colors.ink} strokeWidth={1.5} />
      <Path d={`M${target.x} 0h5v4h-5Z`} fill={colors.ink} />
    </Svg>
  );
}
