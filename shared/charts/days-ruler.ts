import { scaleLinear } from 'd3-scale';

export interface RulerEntry {
  id: string;
  /** null: no limit is reached by the horizon. */
  days: number | null;
}

export interface RulerTick {
  day: number;
  x: number;
  /** Whether it carries a number; the others are short strokes. */
  isLabelled: boolean;
}

export interface RulerBar {
  id: string;
  /** Where the bar ends; for one that outlasts the horizon, the end of the ruler. */
  x: number;
  isMet: boolean;
  /** Runs on past the end of the ruler. */
  isOpenEnded: boolean;
  /** A ruler of its own, where the bar would be too short to read beside the target. */
  zoom: { lastDay: number; ticks: RulerTick[]; x: number } | null;
}

export interface DaysRulerLayout {
  lastDay: number;
  ticks: RulerTick[];
  target: { day: number; x: number };
  bars: RulerBar[];
}

/** Below this part of the target a bar gets a zoomed ruler. */
const ZOOM_BELOW = 0.06;
const PX_PER_LABEL = 58;

/** Bars of days on one scale from day 0, the target among them with room behind it. */
export function layoutDaysRuler(entries: RulerEntry[], targetDays: number, width: number): DaysRulerLayout {
  const reached = entries.flatMap((entry) => (entry.days === null ? [] : [entry.days]));
  const hasOpenEnded = entries.some((entry) => entry.days === null);
  const longest = Math.max(...reached, 0);
  const lastDay = Math.max(targetDays * (hasOpenEnded ? 1.6 : 1.25), longest * (hasOpenEnded ? 1.25 : 1.08));
  const toX = scaleLinear([0, lastDay], [0, width]);
  const bars = entries.map((entry): RulerBar => {
    if (entry.days === null) return { id: entry.id, x: width, isMet: true, isOpenEnded: true, zoom: null };
    return {
      id: entry.id,
      x: toX(entry.days),
      isMet: entry.days >= targetDays,
      isOpenEnded: false,
      zoom: entry.days > 0 && entry.days < targetDays * ZOOM_BELOW ? zoomOn(entry.days, width) : null,
    };
  });
  return {
    lastDay,
    ticks: rulerTicks(lastDay, width),
    target: { day: targetDays, x: toX(targetDays) },
    bars,
  };
}

function zoomOn(days: number, width: number): NonNullable<RulerBar['zoom']> {
  const lastDay = days * 1.6;
  return { lastDay, ticks: rulerTicks(lastDay, width), x: scaleLinear([0, lastDay], [0, width])(days) };
}

/** Round days with a number each, and four short strokes between. */
export function rulerTicks(lastDay: number, width: number): RulerTick[] {
  const toX = scaleLinear([0, lastDay], [0, width]);
  const labelled = toX.ticks(Math.max(2, Math.floor(width / PX_PER_LABEL)));
  const step = (labelled[1] ?? lastDay) - (labelled[0] ?? 0);
  if (!(step > 0)) return [];
  const ticks: RulerTick[] = [];
  for (let index = 0; ; index += 1) {
    const day = (index * step) / 5;
    if (day > lastDay * (1 + 1e-9)) return ticks;
    ticks.push({ day: Number(day.toPrecision(12)), x: toX(day), isLabelled: index % 5 === 0 });
  }
}
