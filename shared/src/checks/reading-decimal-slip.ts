import { sheetCheck } from './check.js';
import { explain } from './plausibility.js';
import { readPoints } from './sheet-view.js';

export const readingDecimalSlip = sheetCheck({
  id: 'reading-decimal-slip',
  title: 'Slip of the unit or the decimal point',
  about: 'A reading that is out of its usual range, but would fit it in another unit.',
  severity: 'question',
  messages: {
    'ten-times-less':
      '{point} reads {read}; {meant} would be usual. Were centimetres read, or did the decimal point slip?',
    'ten-times-more':
      '{point} reads {read}; {meant} would be usual. Is there a digit too many, or did the decimal point slip?',
    'inches-as-mm': '{point} reads {read}; {meant} would be usual. Were inches read?',
    'mm-as-inches': '{point} reads {read}; {meant} would be usual. Were millimetres entered as inches?',
  },
  run: (sheet, raise) => {
    for (const { point, mention, range, readings } of readPoints(sheet)) {
      for (const reading of readings) {
        const found = explain(reading, point, range);
        if (found.cause !== 'slip') continue;
        raise(found.slip, { point: mention, read: reading.length, meant: found.meant });
        break;
      }
    }
  },
});
