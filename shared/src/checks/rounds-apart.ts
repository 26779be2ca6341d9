import { allowedSpreadAt } from '../points/tolerance.js';
import { isLonger } from '../units/length.js';
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
    for (const { point, mention, accepted, readings } of readPoints(sheet)) {
      const how = readings.find(({ method }) => method === 'flat-doubled')?.method ?? point.how;
      const allowed = allowedSpreadAt({ ...point, how }, accepted.value, accepted.tapeJoins);
      if (!isLonger(accepted.spread, allowed)) continue;
      raise('apart', { point: mention, spread: accepted.spread, allowed });
    }
  },
});
