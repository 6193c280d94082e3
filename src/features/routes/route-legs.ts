import type { LegFormValues } from './route-form-values';

export interface RouteLegs {
  legs: LegFormValues[];
  nextKey: number;
}

export type LegEvent =
  | { type: 'leg_added' }
  | { type: 'leg_removed'; key: string }
  | { type: 'leg_moved'; key: string; by: number };

const FIRST_LEG = { name: '', temperature_C: '', relative_humidity: '', days: '' };

export function legsAfter({ legs, nextKey }: RouteLegs, event: LegEvent): RouteLegs {
  switch (event.type) {
    case 'leg_added': {
      // Conditions seldom change wholly from leg to leg: start from those of the last one.
      const added = { ...(legs.at(-1) ?? FIRST_LEG), name: '', days: '', key: `leg-${nextKey}` };
      return { legs: [...legs, added], nextKey: nextKey + 1 };
    }
    case 'leg_removed':
      return { legs: legs.filter((leg) => leg.key !== event.key), nextKey };
    case 'leg_moved': {
      const from = legs.findIndex((leg) => leg.key === event.key);
      const leg = legs[from];
      const to = from + event.by;
      if (!leg || to < 0 || to >= legs.length) return { legs, nextKey };
      return { legs: legs.toSpliced(from, 1).toSpliced(to, 0, leg), nextKey };
    }
  }
}
