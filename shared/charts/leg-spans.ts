export interface LegSpan {
  /** Which leg of the route, from 0. */
  leg: number;
  startDay: number;
  endDay: number;
}

const MOST_SPANS = 240;

/** When each leg runs, up to `lastDay`: the last leg held, or the whole route again and again. */
export function legSpans(legDays: number[], afterLast: 'hold' | 'repeat', lastDay: number): LegSpan[] {
  const spans: LegSpan[] = [];
  const total = legDays.reduce((sum, days) => sum + days, 0);
  if (!(total > 0)) return spans;
  let day = 0;
  while (day < lastDay && spans.length < MOST_SPANS) {
    for (let leg = 0; leg < legDays.length && day < lastDay; leg += 1) {
      const isHeld = afterLast === 'hold' && leg === legDays.length - 1;
      const endDay = isHeld ? lastDay : Math.min(lastDay, day + (legDays[leg] ?? 0));
      spans.push({ leg, startDay: day, endDay });
      day = endDay;
    }
    if (afterLast === 'hold') break;
  }
  return spans;
}
