import { scaleLinear } from 'd3-scale';
import { legSpans, type LegSpan } from './leg-spans';
import { rulerTicks, type RulerTick } from './days-ruler';

export interface TimeCourseOptions {
  days: number[];
  values: number[];
  /** Lines of limits on the value axis. */
  limits: number[];
  /** The course is drawn to here. */
  lastDay: number;
  legDays: number[];
  afterLast: 'hold' | 'repeat';
  width: number;
  height: number;
}

export interface TimeCourseLayout {
  line: string;
  valueTicks: { value: number; y: number }[];
  dayTicks: RulerTick[];
  limits: { value: number; y: number }[];
  legs: (LegSpan & { x: number; width: number })[];
  toX: (day: number) => number;
  toY: (value: number) => number;
}

/** One quantity over the days, the legs behind it, its limits across it. */
export function layoutTimeCourse(options: TimeCourseOptions): TimeCourseLayout {
  const { width, height, lastDay } = options;
  const shown = options.days.flatMap((day, index) => {
    const value = options.values[index];
    return day <= lastDay && value !== undefined ? [{ day, value }] : [];
  });
  const all = [...shown.map((point) => point.value), ...options.limits];
  const low = Math.min(...all);
  const high = Math.max(...all);
  // From zero, unless the values lie in a narrow band far from it: then the band, or nothing would be seen.
  const isBand = low > 0 && low > 0.6 * high;
  const room = (high - low) * 0.1 || Math.abs(high) * 0.1 || 1;
  const toY = scaleLinear([isBand ? low - room : Math.min(0, low), high + room], [height, 0]).nice(4);
  const toX = scaleLinear([0, lastDay], [0, width]);
  const line = shown
    .map((point, index) => `${index === 0 ? 'M' : 'L'}${round(toX(point.day))} ${round(toY(point.value))}`)
    .join('');
  return {
    line,
    valueTicks: toY.ticks(4).map((value) => ({ value, y: toY(value) })),
    dayTicks: rulerTicks(lastDay, width),
    limits: options.limits.map((value) => ({ value, y: toY(value) })),
    legs: legSpans(options.legDays, options.afterLast, lastDay).map((span) => ({
      ...span,
      x: toX(span.startDay),
      width: toX(span.endDay) - toX(span.startDay),
    })),
    toX,
    toY,
  };
}

function round(value: number): number {
  return Math.round(value * 100) / 100;
}
