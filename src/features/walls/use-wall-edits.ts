import { useFormikContext } from 'formik';
import { useEffect, useRef, useState } from 'react';
import type { WallDraft } from './wall-draft';
import { historyAfter, historyOf, type WallHistory, type WallHistoryEvent } from './wall-history';

export interface WallEdits {
  wall: WallDraft;
  happened: (event: WallHistoryEvent) => void;
  canUndo: boolean;
  canRedo: boolean;
}

/** Ties the form's values to a history of edits. Two events between two drawings both count. */
export function useWallEdits(onChange: (wall: WallDraft) => void): WallEdits {
  const formik = useFormikContext<WallDraft>();
  const [history, setHistory] = useState<WallHistory>(() => historyOf(formik.values));
  const latest = useRef(history);
  const tell = useRef(onChange);
  useEffect(() => {
    tell.current = onChange;
  }, [onChange]);

  const happened = (event: WallHistoryEvent) => {
    const next = historyAfter(latest.current, event);
    if (next === latest.current) return;
    const isOtherWall = next.present !== latest.current.present;
    latest.current = next;
    setHistory(next);
    if (!isOtherWall) return;
    void formik.setValues(next.present);
    tell.current(next.present);
  };

  return {
    wall: history.present,
    happened,
    canUndo: history.past.length > 0,
    canRedo: history.future.length > 0,
  };
}
