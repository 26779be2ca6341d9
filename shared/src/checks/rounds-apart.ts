import { allowedSpreadAt } from '../points/tolerance.js';
import { isLonger } from '../units/length.js';
import { sheetCheck } from './check.js';
import { readPoints } from './sheet-view.js';
import { transposedPair } from './transposed-digits.js';

export const roundsApart = sheetCheck({
  id: 'rounds-apart',
  title: 'Rounds that lie apart',
  about: 'Two or more readings of one point that differ by more than the house allows.',
  severity: 'question',
  messages: {
    apart: 'The readings of {point} differ by {spread}; {allowed} is allowed. Read it once more.',
  },
  run: (sheet, raise) => {
    for (const read of readPoints(sheet)) {
      const { point, mention, accepted, readings } = read;
      // Two rounds whose digits changed places have a check of their own, which says more.
      if (readings.length === 2 && transposedPair(read)) continue;
      const how = readings.find(({ method }) => method === 'flat-doubled')?.method ?? point.how;
      const allowed = allowedSpreadAt({ ...point, how }, accepted.value, accepted.tapeJoins);
      if (!isLonger(accepted.spread, allowed)) continue;
      raise('apart', { point: mention, spread: accepted.spread, allowed });
    }
  },
});
