import { isLonger } from '../units/length.js';
import { sheetCheck } from './check.js';
import { readPoints } from './sheet-view.js';

export const restLongerThanTape = sheetCheck({
  id: 'rest-longer-than-tape',
  title: 'Rest longer than the tape',
  about: 'A reading in whole tapes whose rest is longer than the tape itself.',
  severity: 'stop',
  messages: {
    longer:
      '{point} has a rest of {rest} after whole tapes of {tape}; a rest cannot be longer than the tape.',
  },
  run: (sheet, raise) => {
    for (const { mention, readings } of readPoints(sheet)) {
      const lengths = readings.find(
        ({ tapeLengths: one }) => one && isLonger(one.rest, one.tape),
      )?.tapeLengths;
      if (lengths) raise('longer', { point: mention, rest: lengths.rest, tape: lengths.tape });
    }
  },
});
