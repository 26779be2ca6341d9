import { allowedSpread } from '../points/tolerance.js';
import { isLonger, times } from '../units/length.js';
import { sheetCheck } from './check.js';
import { readPoints } from './sheet-view.js';

export const roundsApart = sheetCheck({
  id: 'rounds-apart',
  title: 'Rounds that lie apart',
  about: 'Two or more readings of one point that differ by more than the house allows.',
  severity: 'question',
  messages: {
    apart: 'The readings of {point} differ by {spread}; {allowed} is allowed. Read it once more.',
  },
  run: (sheet, raise) => {
    for (const { point, accepted } of readPoints(sheet)) {
      const base = allowedSpread(point.tolerance, accepted.value, accepted.tapeJoins);
      // A millimetre on the half that was read is two on the whole.
      const allowed = point.how === 'flat-doubled' ? times(base, 2) : base;
      if (!isLonger(accepted.spread, allowed)) continue;
      raise('apart', { point: { mentioned: point.id }, spread: accepted.spread, allowed });
    }
  },
});
