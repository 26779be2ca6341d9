import type { HandlingStep } from '@ellwand/shared/points/point';
import { useState } from 'react';
import { isDone, type SheetRow } from './rows.js';
import { useTurning } from './use-turning.js';

/** Where the work is: the current row, and the turning of the garment between steps. */
export function usePlace(sheetId: string, rows: readonly SheetRow[]) {
  const [key, setKey] = useState(() => (rows.find((row) => !isDone(row)) ?? rows[0]!).key);
  const [focusAsked, setFocusAsked] = useState({ key, times: 0 });
  const current = rows.find((row) => row.key === key) ?? rows[0]!;
  const turning = useTurning(sheetId);
  const stepOf = (rowKey: string): HandlingStep | undefined =>
    rows.find((row) => row.key === rowKey)?.point.step ??
    rows.find((row) => rowKey.startsWith(`${row.point.id}:`))?.point.step;
  /** Makes a row the current one; where the garment must be turned first, that is said, once. */
  const enter = (to: string) => {
    setKey(to);
    const step = stepOf(to);
    if (step !== undefined) turning.askFor(step);
  };
  const go = (to: string) => {
    enter(to);
    setFocusAsked(({ times }) => ({ key: to, times: times + 1 }));
  };
  return { current, enter, go, focusAsked, turn: turning.asked, turned: turning.done };
}
