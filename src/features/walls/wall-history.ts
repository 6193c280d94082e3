import { wallAfter, type WallDraft, type WallEvent } from './wall-draft';

/** Edits as they can be taken back. One run of typing in one field is one step. */
export interface WallHistory {
  past: WallDraft[];
  present: WallDraft;
  future: WallDraft[];
  /** What the latest step was, where a further event of the same name belongs to it. */
  openStep: string | null;
}

export type WallHistoryEvent =
  | WallEvent
  | { type: 'undone' }
  | { type: 'redone' }
  | { type: 'field_left' }
  | { type: 'draft_opened'; wall: WallDraft };

const MOST_STEPS = 200;

export function historyOf(wall: WallDraft): WallHistory {
  return { past: [], present: wall, future: [], openStep: null };
}

export function historyAfter(history: WallHistory, event: WallHistoryEvent): WallHistory {
  switch (event.type) {
    case 'undone': {
      const previous = history.past.at(-1);
      if (previous === undefined) return history;
      return {
        past: history.past.slice(0, -1),
        present: previous,
        future: [history.present, ...history.future],
        openStep: null,
      };
    }
    case 'redone': {
      const [next, ...future] = history.future;
      if (next === undefined) return history;
      return { past: [...history.past, history.present], present: next, future, openStep: null };
    }
    case 'field_left':
      return { ...history, openStep: null };
    case 'draft_opened':
      return historyOf(event.wall);
    default:
      return afterEdit(history, event);
  }
}

function afterEdit(history: WallHistory, event: WallEvent): WallHistory {
  const present = wallAfter(history.present, event);
  if (present === history.present) return history;
  const step = stepName(event);
  const continues = step !== null && step === history.openStep;
  const past = continues ? history.past : [...history.past, history.present].slice(-MOST_STEPS);
  return { past, present, future: [], openStep: step };
}

function stepName(event: WallEvent): string | null {
  if (event.type === 'gauge_typed') return `gauge ${event.key}`;
  return event.type === 'name_typed' ? 'name' : null;
}
