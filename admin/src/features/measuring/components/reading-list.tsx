import { handlingStepLabels, handlingSteps } from '@ellwand/shared/points/point';
import { useEffect, useRef } from 'react';
import { rowState } from '../model/row-state.js';
import { againOf } from '../model/rows.js';
import type { SheetDesk } from '../model/use-sheet-desk.js';
import { firstBoxId, ReadingRow } from './reading-row.js';

/** Every row in handling order, under the step in which the garment lies. */
export function ReadingList({ desk }: { readonly desk: SheetDesk }) {
  const { focusAsked, rows, turn } = desk;
  const followed = useRef(0);
  useEffect(() => {
    // Each asking is followed once, and after the garment has been turned: a reading that arrives
    // later must not pull the focus back.
    if (turn !== null || focusAsked.times === followed.current) return;
    const row = rows.find(({ key }) => key === focusAsked.key);
    const box = row && document.getElementById(firstBoxId(row));
    if (!box) return;
    followed.current = focusAsked.times;
    // A question that closes gives the focus back in a microtask of its own: the work goes on after that.
    queueMicrotask(() => {
      box.focus();
      box.closest('li')?.scrollIntoView({ block: 'nearest' });
    });
  }, [turn, focusAsked, rows]);
  return (
    <div>
      {handlingSteps.map((step) => {
        const own = rows.filter(({ point }) => point.step === step);
        if (own.length === 0) return null;
        return (
          <section key={step} aria-labelledby={`step-${step}`}>
            <h3
              id={`step-${step}`}
              className="border-b border-ink px-3 pb-1 pt-4 text-label font-semibold text-ink-2"
            >
              {handlingStepLabels[step]}
            </h3>
            <ul>
              {own.map((row) => (
                <ReadingRow
                  key={row.key}
                  desk={desk}
                  row={row}
                  current={desk.current.key === row.key}
                  draft={desk.draftOf(row)}
                  state={rowState(row, rows, desk.sheet.kind)}
                  mistake={desk.mistakes[row.key]}
                  again={againOf(row, rows)}
                />
              ))}
            </ul>
          </section>
        );
      })}
    </div>
  );
}
