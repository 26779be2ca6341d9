import { sheetCheck } from './check.js';
import { explain } from './plausibility.js';
import { readPoints } from './sheet-view.js';

export const outsideSoftRange = sheetCheck({
  id: 'outside-soft-range',
  title: 'Outside the usual range',
  about: 'A reading well below or above what is usual for its point, with no slip that would explain it.',
  severity: {
    'just-below': 'note',
    'just-above': 'note',
    below: 'question',
    above: 'question',
  },
  messages: {
    'just-below': '{point} reads {read}, a little under the usual {bound} or more.',
    'just-above': '{point} reads {read}, a little over the usual {bound} or less.',
    below: '{point} reads {read}; {bound} or more is usual. Read it again, or say why it is so small.',
    above: '{point} reads {read}; {bound} or less is usual. Read it again, or say why it is so large.',
  },
  run: (sheet, raise) => {
    for (const { point, mention, range, readings } of readPoints(sheet)) {
      for (const reading of readings) {
        const found = explain(reading, point, range);
        if (found.cause !== 'unexplained') continue;
        raise(found.side, { point: mention, read: reading.length, bound: found.bound });
        break;
      }
    }
  },
});
