import { useState } from 'react';

/** Which measuring point is lit in a drawing and in its table: both read and set the same. */
export interface LitPoints {
  /** Pointed at or in focus, else the chosen one. */
  readonly lit: string | null;
  readonly chosen: string | null;
  readonly light: (pointId: string | null) => void;
  /** From the table: lights the line and keeps it lit; once more puts it out. */
  readonly chooseRow: (pointId: string) => void;
  /** From the drawing: keeps it lit and goes to its row. */
  readonly chooseLine: (pointId: string) => void;
}

/** `rowId` gives the id of a point's control in the table, which takes the focus when its line is clicked. */
export function useLitPoints(rowId: (pointId: string) => string): LitPoints {
  const [pointed, light] = useState<string | null>(null);
  const [chosen, choose] = useState<string | null>(null);
  return {
    lit: pointed ?? chosen,
    chosen,
    light,
    chooseRow: (pointId) => choose((before) => (before === pointId ? null : pointId)),
    chooseLine: (pointId) => {
      choose(pointId);
      const row = document.getElementById(rowId(pointId));
      row?.focus({ preventScroll: true });
      row?.scrollIntoView({ block: 'nearest' });
    },
  };
}
