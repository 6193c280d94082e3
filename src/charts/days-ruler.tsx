import type { ReactNode } from 'react';
import { View } from 'react-native';
import Svg, { G, Line, Path, Rect } from 'react-native-svg';
import { Body, Figure, Inline, SPACE, Small, useTheme } from '../ui';
import type { Colors } from '../ui';
import { layoutDaysRuler } from '../../shared/charts/days-ruler';
import type { DaysRulerLayout, RulerBar, RulerTick } from '../../shared/charts/days-ruler';
import { ChartFrame } from './chart-frame';
import { ChartText, monoWidth } from './chart-text';

export interface DaysRulerEntry {
  id: string;
  label: string;
  /** null: no limit is reached by the horizon. */
  days: number | null;
  /** '48' or 'beyond 3650'. */
  figures: string;
  /** What ends it; null where nothing does. */
  cause: { words: string; gas: 'oxygen' | 'water' } | null;
  /** Beside the cause: the wall as a strip. */
  aside?: ReactNode;
}

export interface DaysRulerProps {
  name: string;
  sentence: string;
  entries: DaysRulerEntry[];
  targetDays: number;
  formatDays: (days: number) => string;
}

const AXIS_PX = 42;
const AXIS_Y = 36;
const BAR_PX = 12;
const BAR_ROW_PX = 22;
const ZOOM_ROW_PX = 44;
/** Room at the right end for the last number and for an open end. */
const END_PX = 14;

/** Days on the shelf on one ruler, the target flagged: a filled bar meets it, an outlined one does not. */
export function DaysRuler({ name, sentence, entries, targetDays, formatDays }: DaysRulerProps) {
  const layoutAt = (width: number) => layoutDaysRuler(entries, targetDays, width - END_PX);
  return (
    <View style={{ gap: SPACE.x2 }}>
      <ChartFrame name={name} sentence={sentence}>
        {(width) => <Axis layout={layoutAt(width)} width={width} formatDays={formatDays} />}
      </ChartFrame>
      {entries.map((entry, index) => (
        <View key={entry.id} style={{ gap: SPACE.x1 }}>
          <View
            style={{
              flexDirection: 'row',
              justifyContent: 'space-between',
              alignItems: 'baseline',
              gap: SPACE.x3,
            }}
          >
            <View style={{ flexShrink: 1, minWidth: 0 }}>
              <Body weight="medium">{entry.label}</Body>
            </View>
            <Figure value={entry.figures} unit="days" isStrong />
          </View>
          <ChartFrame name={entry.label} sentence={barSentence(entry, targetDays, formatDays)}>
            {(width) => {
              const layout = layoutAt(width);
              const bar = layout.bars[index];
              return bar === undefined ? null : (
                <Bar bar={bar} entry={entry} layout={layout} width={width} formatDays={formatDays} />
              );
            }}
          </ChartFrame>
          <Inline justify="space-between">
            <Small>
              {entry.cause === null ? 'no limit reached' : 'ends by '}
              {entry.cause === null ? null : (
                <Small tone={entry.cause.gas} weight="semibold">
                  {entry.cause.words}
                </Small>
              )}
            </Small>
            {entry.aside}
          </Inline>
        </View>
      ))}
    </View>
  );
}

function barSentence(
  entry: DaysRulerEntry,
  targetDays: number,
  formatDays: (days: number) => string,
): string {
  const verdict = entry.days === null || entry.days >= targetDays ? 'meets' : 'misses';
  return `${entry.figures} days, ${verdict} the target of ${formatDays(targetDays)}.`;
}

interface AxisProps {
  layout: DaysRulerLayout;
  width: number;
  formatDays: (days: number) => string;
}

function Axis({ layout, width, formatDays }: AxisProps) {
  const { colors } = useTheme();
  const flag = `target ${formatDays(layout.target.day)}`;
  const flagWidth = monoWidth(flag) + 8;
  const isFlagLeft = layout.target.x + flagWidth > width;
  const x = layout.target.x + 0.5;
  const flagX = isFlagLeft ? x - flagWidth : x;
  return (
    <Svg width={width} height={AXIS_PX} aria-hidden>
      <Ticks ticks={layout.ticks} y={AXIS_Y} formatDays={formatDays} flagX={layout.target.x} />
      <Line x1={0} x2={width - END_PX} y1={AXIS_Y} y2={AXIS_Y} stroke={colors.ink} strokeWidth={1} />
      <Rect x={flagX} y={0} width={flagWidth} height={15} fill={colors.ink} />
      <Line x1={x} x2={x} y1={0} y2={AXIS_PX} stroke={colors.ink} strokeWidth={1.5} />
      <FlagText x={flagX + flagWidth / 2} text={flag} />
    </Svg>
  );
}

function FlagText({ x, text }: { x: number; text: string }) {
  return (
    <ChartText x={x} y={11} anchor="middle" font="monoMedium" tone="inverse">
      {text}
    </ChartText>
  );
}

interface TicksProps {
  ticks: RulerTick[];
  y: number;
  /** Where the flag's pole stands: a number it would cut through is left out, the flag says its own. */
  flagX?: number;
  formatDays: (days: number) => string;
}

function isCutByFlag(tick: RulerTick, label: string, flagX: number | undefined): boolean {
  return flagX !== undefined && tick.day !== 0 && Math.abs(tick.x - flagX) < monoWidth(label) / 2 + 3;
}

function Ticks({ ticks, y, flagX, formatDays }: TicksProps) {
  const { colors } = useTheme();
  return (
    <>
      {ticks.map((tick) => (
        <G key={tick.day}>
          <Line
            x1={tick.x + 0.5}
            x2={tick.x + 0.5}
            y1={y}
            y2={y - (tick.isLabelled ? 7 : 4)}
            stroke={colors.inkSecond}
            strokeWidth={1}
          />
          {tick.isLabelled && !isCutByFlag(tick, formatDays(tick.day), flagX) ? (
            <ChartText
              x={tick.day === 0 ? 0 : tick.x}
              y={y - 10}
              anchor={tick.day === 0 ? 'start' : 'middle'}
            >
              {formatDays(tick.day)}
            </ChartText>
          ) : null}
        </G>
      ))}
    </>
  );
}

interface BarProps {
  bar: RulerBar;
  entry: DaysRulerEntry;
  layout: DaysRulerLayout;
  width: number;
  formatDays: (days: number) => string;
}

function Bar({ bar, entry, layout, width, formatDays }: BarProps) {
  const { colors } = useTheme();
  const color = barColor(colors, entry);
  const top = (BAR_ROW_PX - BAR_PX) / 2;
  const targetX = layout.target.x + 0.5;
  return (
    <Svg width={width} height={bar.zoom === null ? BAR_ROW_PX : BAR_ROW_PX + ZOOM_ROW_PX} aria-hidden>
      <Line x1={0} x2={width - END_PX} y1={BAR_ROW_PX / 2} y2={BAR_ROW_PX / 2} stroke={colors.lineFaint} />
      {bar.isOpenEnded ? (
        <Path d={openEnd(bar.x, top)} fill={color} />
      ) : (
        <BarRect x={bar.x} top={top} color={color} isFilled={bar.isMet} />
      )}
      <Line
        x1={targetX}
        x2={targetX}
        y1={0}
        y2={BAR_ROW_PX}
        stroke={bar.isMet ? colors.sheet : colors.ink}
        strokeWidth={1.5}
        strokeDasharray="3 2"
      />
      {bar.zoom === null ? null : (
        <G transform={`translate(0 ${BAR_ROW_PX})`}>
          <Path
            d={`M0 -2L0 6M${bar.x} -2L${bar.zoom.x} 6`}
            stroke={colors.inkThird}
            strokeWidth={0.75}
            fill="none"
          />
          <BarRect x={bar.zoom.x} top={6} color={color} isFilled={bar.isMet} />
          <Ticks ticks={bar.zoom.ticks} y={ZOOM_ROW_PX - 4} formatDays={formatDays} />
          <Line
            x1={0}
            x2={width - END_PX}
            y1={ZOOM_ROW_PX - 4}
            y2={ZOOM_ROW_PX - 4}
            stroke={colors.inkSecond}
          />
        </G>
      )}
    </Svg>
  );
}

function BarRect({ x, top, color, isFilled }: { x: number; top: number; color: string; isFilled: boolean }) {
  const { colors } = useTheme();
  return (
    <>
      <Rect
        x={0.75}
        y={top}
        width={Math.max(1, x - 1.5)}
        height={BAR_PX}
        fill={isFilled ? color : colors.sheet}
        stroke={color}
        strokeWidth={1.5}
      />
      <Line x1={x} x2={x} y1={top - 3} y2={top + BAR_PX + 3} stroke={colors.ink} strokeWidth={2} />
    </>
  );
}

/** The end is an arrow: the bar goes on past the ruler. */
function openEnd(x: number, top: number): string {
  const middle = top + BAR_PX / 2;
  return `M0 ${top}H${x - 2}V${top - 3}L${x + 9} ${middle}L${x - 2} ${top + BAR_PX + 3}V${top + BAR_PX}H0Z`;
}

function barColor(colors: Colors, entry: DaysRulerEntry): string {
  if (entry.cause === null) return colors.inkSecond;
  return entry.cause.gas === 'oxygen' ? colors.oxygen : colors.water;
}
