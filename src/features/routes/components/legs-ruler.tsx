import Svg, { Line, Rect } from 'react-native-svg';
import { formatExact, formatQuantity } from '../../../../shared/units/format';
import { ChartFrame } from '../../../charts/chart-frame';
import { ChartText } from '../../../charts/chart-text';
import { useUnitSystem } from '../../../session';
import { useTheme } from '../../../ui';

export interface RulerLeg {
  name: string;
  temperature_C: number;
  relative_humidity: number;
  days: number;
}

const TOP_PX = 22;
const BAND_PX = 26;
const HEIGHT_PX = 72;
const LEAST_LEG_PX = 3;
const LABEL_FROM_PX = 44;

/** The legs as a ruler of days, one after the other. */
export function LegsRuler({ legs, afterLast }: { legs: RulerLeg[]; afterLast: 'hold' | 'repeat' }) {
  const unitSystem = useUnitSystem();
  const temperature = (value: number) =>
    formatQuantity(value, 'temperature_C', { unitSystem, isExact: true }).text;
  const total = legs.reduce((sum, leg) => sum + leg.days, 0);
  const sentence = legs
    .map(
      (leg, index) =>
        `${leg.name === '' ? `Leg ${index + 1}` : leg.name}: ${formatExact(leg.days)} days at ${temperature(leg.temperature_C)}, ${formatExact(leg.relative_humidity * 100)} %`,
    )
    .join('; ');
  const end = afterLast === 'hold' ? 'then stays there' : 'then begins again';
  return (
    <ChartFrame name="Route" sentence={`${sentence}; ${end}.`}>
      {(width) => <Ruler legs={legs} width={width} total={total} end={end} temperature={temperature} />}
    </ChartFrame>
  );
}

interface RulerProps {
  legs: RulerLeg[];
  width: number;
  total: number;
  end: string;
  temperature: (value: number) => string;
}

function Ruler({ legs, width, total, end, temperature }: RulerProps) {
  const { colors } = useTheme();
  const drawn = placedLegs(legs, { total, width });
  return (
    <Svg width={width} height={HEIGHT_PX} aria-hidden>
      {drawn.map(({ x: left, legWidth }, index) => (
        <Rect
          key={index}
          x={left}
          y={TOP_PX}
          width={legWidth}
          height={BAND_PX}
          fill={index % 2 === 0 ? colors.sheet : colors.lineFaint}
          stroke={colors.ink}
          strokeWidth={1}
        />
      ))}
      {drawn.map(({ x: left }, index) => (
        <Line key={index} x1={left} x2={left} y1={TOP_PX - 6} y2={TOP_PX} stroke={colors.inkSecond} />
      ))}
      {drawn.map(({ x: left, legWidth, day: starts }, index) =>
        legWidth < LABEL_FROM_PX ? null : (
          <ChartText key={index} x={left} y={TOP_PX - 9}>
            {formatExact(starts)}
          </ChartText>
        ),
      )}
      {drawn.map(({ leg, x: left, legWidth }, index) =>
        legWidth < LABEL_FROM_PX ? null : (
          <ChartText key={index} x={left + legWidth / 2} y={TOP_PX + 17} anchor="middle" tone="ink">
            {temperature(leg.temperature_C)}
          </ChartText>
        ),
      )}
      <Line x1={width - 1} x2={width - 1} y1={TOP_PX - 6} y2={TOP_PX} stroke={colors.inkSecond} />
      <ChartText x={width - 2} y={HEIGHT_PX - 8} anchor="end" font="regular">
        {`${formatExact(total)} days, ${end}`}
      </ChartText>
    </Svg>
  );
}

interface PlacedLeg {
  leg: RulerLeg;
  x: number;
  legWidth: number;
  /** The day on which it begins. */
  day: number;
}

/** Widths in proportion to days, each leg at least wide enough to be seen. */
function placedLegs(legs: RulerLeg[], { total, width }: { total: number; width: number }): PlacedLeg[] {
  const room = width - 2 - LEAST_LEG_PX * legs.length;
  return legs.reduce<PlacedLeg[]>((placed, leg) => {
    const last = placed.at(-1);
    const x = last === undefined ? 1 : last.x + last.legWidth;
    const day = last === undefined ? 0 : last.day + last.leg.days;
    return [...placed, { leg, x, day, legWidth: LEAST_LEG_PX + (room * leg.days) / total }];
  }, []);
}
