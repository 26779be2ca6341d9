import { useEffect } from 'react';
import { Button } from '../../../components/ui/button.js';
import { Question } from '../../../components/ui/dialog.js';
import type { SheetDesk } from '../model/use-sheet-desk.js';

interface KeyWays {
  readonly onNotTaken: () => void;
  readonly onTab: (index: number) => void;
}

const listed: readonly (readonly [string, string])[] = [
  ['Enter', 'Keep the reading, go on to the next point'],
  ['Arrow down, arrow up', 'Next row, row before'],
  ['Alt + C', 'Cannot be taken'],
  ['Alt + R', 'Read again'],
  ['Alt + Z', 'Undo the last reading'],
  ['Alt + P', 'Put it away for now'],
  ['Alt + 1 to 6', 'Readings, findings, worked out, noted, box list, facts'],
];

/** Everything at the table by keys alone. Each has Alt with it, so that no figure is ever taken for an order. */
export function useTableKeys(desk: SheetDesk, { onNotTaken, onTab }: KeyWays): void {
  useEffect(() => {
    const press = (event: KeyboardEvent) => {
      if (!event.altKey || event.ctrlKey || event.metaKey || desk.locked || isInDialog()) return;
      const key = event.code.replace(/^Key|^Digit/, '').toLowerCase();
      const orders: Readonly<Record<string, () => void>> = {
        c: onNotTaken,
        r: () => desk.current.reading && desk.readAgain(desk.current),
        z: desk.undo,
        p: () => desk.setPausing(''),
      };
      const order = /^[1-6]$/.test(key) ? () => onTab(Number(key) - 1) : orders[key];
      if (!order) return;
      event.preventDefault();
      order();
    };
    document.addEventListener('keydown', press);
    return () => document.removeEventListener('keydown', press);
  });
}

const isInDialog = () => document.querySelector('[role="dialog"]') !== null;

export function KeysQuestion({ open, onClose }: { readonly open: boolean; readonly onClose: () => void }) {
  return (
    <Question
      open={open}
      onClose={onClose}
      title="Keys"
      actions={
        <Button height="table" onClick={onClose}>
          Back to the sheet
        </Button>
      }
    >
      <dl className="divide-y divide-hair">
        {listed.map(([keys, does]) => (
          <div key={keys} className="grid grid-cols-[10rem_minmax(0,1fr)] gap-3 py-2">
            <dt className="font-medium">{keys}</dt>
            <dd>{does}</dd>
          </div>
        ))}
      </dl>
    </Question>
  );
}
