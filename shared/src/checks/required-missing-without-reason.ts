import { sheetCheck } from './check.js';
import type { SheetView } from './sheet-view.js';

function wasRead({ taken, impossible }: SheetView, pointId: string): boolean {
  return [...taken, ...impossible].some((reading) => reading.pointId === pointId);
}

export const requiredMissingWithoutReason = sheetCheck({
  id: 'required-missing-without-reason',
  title: 'Required point neither read nor explained',
  about: 'A point that the protocol requires, without a reading and without a reason.',
  severity: 'stop',
  messages: {
    missing: '{point} has not been read. Read it, or say why it cannot be taken.',
    unexplained: '{point} is marked as not taken, without a reason.',
  },
  run: (sheet, raise) => {
    for (const { pointId, required } of sheet.protocol.points) {
      if (!required || wasRead(sheet, pointId)) continue;
      const left = sheet.notTaken.filter((reading) => reading.pointId === pointId);
      const explained = left.some((reading) => reading.state === 'not-taken' && reading.notTakenReason);
      if (explained) continue;
      raise(left.length ? 'unexplained' : 'missing', { point: { mentioned: pointId } });
    }
  },
});
