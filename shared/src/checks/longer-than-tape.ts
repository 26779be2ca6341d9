import { howTaken } from '../readings/accepted-value.js';
import type { TakenReading } from '../readings/reading.js';
import { isLonger, times } from '../units/length.js';
import { sheetCheck } from './check.js';
import { readPoints } from './sheet-view.js';

export const longerThanTape = sheetCheck({
  id: 'longer-than-tape',
  title: 'Longer than the tape, without a count',
  about: 'A reading longer than the tape that was used, without a word on how many tapes it took.',
  severity: 'question',
  messages: {
    uncounted: '{point} reads {read}, longer than the tape of {tape}. How many whole tapes were counted?',
  },
  run: (sheet, raise) => {
    const { tapeLength, protocol } = sheet;
    if (tapeLength === undefined || tapeLength <= 0) return;
    const isUncounted = (reading: TakenReading): boolean => {
      const tapes = howTaken(reading, protocol.ownPoints) === 'flat-doubled' ? 2 : 1;
      return !reading.tapeLengths && isLonger(reading.length, times(tapeLength, tapes));
    };
    for (const { mention, readings } of readPoints(sheet)) {
      const long = readings.find(isUncounted);
      if (long) raise('uncounted', { point: mention, read: long.length, tape: tapeLength });
    }
  },
});
