import Svg, { Circle, G, Line, Path, Rect } from 'react-native-svg';
import { useTheme } from '../ui';
import { layoutTimeCourse } from '../../shared/charts/time-course';
import { ChartFrame } from './chart-frame';
import { ChartText, monoWidth } from './chart-text';

export interface TimeCourseProps {
  name: string;
  sentence: string;
  gas: 'oxygen' | 'water';
  /** Quantity and unit over the value axis. */
  axisTitle: string;
  days: number[];
  /** In the unit shown. */
  values: number[];
  limits: { value: number; label: string }[];
  /** Where the limit is met; null where it is not. */
  reached: { day: number; value: number } | null;
  targetDays: number;
  lastDay: number;
  legDays: number[];
  afterLast: 'hold' | 'repeat';
  formatValue: (value: number) => string;
  formatDays: (days: number) => string;
}

const PLOT_PX = 116;
const TOP_PX = 34;
const FOOT_PX = 22;
const LEFT_PX = 44;
const RIGHT_PX = 14;

/** One quantity over the days: legs shaded by turns, limit dashed, target marked. */
export function TimeCourse(props: TimeCourseProps) {
  return (
    <ChartFrame name={props.name} sentence={props.sentence}>
      {(width) => <Plot {...props} width={width} />}
    </ChartFrame>
  );
}

function Plot(props: TimeCourseProps & { width: number }) {
  const { width, gas, axisTitle, limits, reached, targetDays, lastDay, formatValue, formatDays } = props;
  const { colors } = useTheme();
  const plotWidth = width - LEFT_PX - RIGHT_PX;
  const course = layoutTimeCourse({
    days: props.days,
    values: props.values,
    limits: limits.map((limit) => limit.value),
    lastDay,
    legDays: props.legDays,
    afterLast: props.afterLast,
    width: plotWidth,
    height: PLOT_PX,
  });
  const ink = gas === 'oxygen' ? colors.oxygen : colors.water;
  const targetX = course.toX(targetDays);
  // The limit's word keeps away from where the course crosses it.
  const isMetLate = reached !== null && course.toX(reached.day) > plotWidth / 2;
  return (
    <Svg width={width} height={TOP_PX + PLOT_PX + FOOT_PX} aria-hidden>
      <ChartText x={0} y={11} font="semibold" tone={gas} sizePx={12.5}>
        {axisTitle}
      </ChartText>
      <G transform={`translate(${LEFT_PX} ${TOP_PX})`}>
        {course.legs.map((leg, index) => (
          <G key={index}>
            {index % 2 === 1 ? (
              <Rect x={leg.x} y={0} width={leg.width} height={PLOT_PX} fill={colors.lineFaint} />
            ) : null}
            <LegNumber x={leg.x} width={leg.width} number={leg.leg + 1} />
          </G>
        ))}
        {course.valueTicks.map((tick) => (
          <G key={tick.value}>
            <Line x1={-4} x2={0} y1={tick.y} y2={tick.y} stroke={colors.inkSecond} />
            <ChartText x={-7} y={tick.y + 4} anchor="end">
              {formatValue(tick.value)}
            </ChartText>
          </G>
        ))}
        <Line x1={0} x2={0} y1={0} y2={PLOT_PX} stroke={colors.inkSecond} />
        <Line x1={0} x2={plotWidth} y1={PLOT_PX} y2={PLOT_PX} stroke={colors.inkSecond} />
        {course.dayTicks.map((tick) => (
          <G key={tick.day}>
            <Line
              x1={tick.x}
              x2={tick.x}
              y1={PLOT_PX}
              y2={PLOT_PX + (tick.isLabelled ? 5 : 3)}
              stroke={colors.inkSecond}
            />
            {tick.isLabelled ? (
              <ChartText x={tick.x} y={PLOT_PX + 17} anchor="middle">
                {formatDays(tick.day)}
              </ChartText>
            ) : null}
          </G>
        ))}
        {targetX > plotWidth ? null : (
          <TargetLine
            x={targetX}
            plotWidth={plotWidth}
            labelY={course.limits.some((limit) => limit.y > PLOT_PX / 2) ? 11 : PLOT_PX - 5}
          />
        )}
        {limits.map((limit, index) => (
          <LimitLine
            key={limit.label}
            y={course.limits[index]?.y ?? 0}
            label={limit.label}
            plotWidth={plotWidth}
            isAtStart={isMetLate}
          />
        ))}
        <Path d={course.line} stroke={ink} strokeWidth={2} fill="none" />
        {reached === null ? null : (
          <Circle
            cx={course.toX(reached.day)}
            cy={course.toY(reached.value)}
            r={4}
            fill={colors.sheet}
            stroke={colors.ink}
            strokeWidth={2}
          />
        )}
      </G>
    </Svg>
  );
}

/** Numbers only, so that wide and narrow legs read alike; what each leg is stands under the charts. */
function LegNumber({ x, width, number }: { x: number; width: number; number: number }) {
  const text = String(number);
  if (monoWidth(text) >= width - 2) return null;
  return (
    <ChartText x={x + width / 2} y={-5} anchor="middle" tone="third">
      {text}
    </ChartText>
  );
}

/** Its word keeps away from the limit's. */
function TargetLine({ x, plotWidth, labelY }: { x: number; plotWidth: number; labelY: number }) {
  const { colors } = useTheme();
  const isLeft = x > plotWidth * 0.7;
  return (
    <>
      <Line x1={x} x2={x} y1={0} y2={PLOT_PX} stroke={colors.ink} strokeWidth={1} strokeDasharray="3 2" />
      <ChartText
        x={isLeft ? x - 4 : x + 4}
        y={labelY}
        anchor={isLeft ? 'end' : 'start'}
        font="regular"
        tone="ink"
      >
        target
      </ChartText>
    </>
  );
}

interface LimitLineProps {
  y: number;
  label: string;
  plotWidth: number;
  isAtStart: boolean;
}

function LimitLine({ y, label, plotWidth, isAtStart }: LimitLineProps) {
  const { colors } = useTheme();
  const width = monoWidth(label) + 4;
  return (
    <>
      <Line
        x1={0}
        x2={plotWidth}
        y1={y}
        y2={y}
        stroke={colors.ink}
        strokeWidth={1.25}
        strokeDasharray="8 3"
      />
      <Rect
        x={isAtStart ? 2 : plotWidth - width}
        y={y < 14 ? y + 2 : y - 13}
        width={width}
        height={12}
        fill={colors.sheet}
        fillOpacity={0.85}
      />
      <ChartText
        x={isAtStart ? 4 : plotWidth - 2}
        y={y < 14 ? y + 12 : y - 3}
        anchor={isAtStart ? 'start' : 'end'}
        tone="ink"
      >
        {label}
      </ChartText>
    </>
  );
}
