import { sheetCheck } from './check.js';
import { explain } from './plausibility.js';
import { readPoints } from './sheet-view.js';

export const halfTypedAsWhole = sheetCheck({
  id: 'half-typed-as-whole',
  title: 'Half entered as the whole, or the whole as half',
  about: 'A reading that is out of its usual range, while twice or half of it would fit.',
  severity: 'question',
  messages: {
    half: '{point} reads {read}; twice that, {meant}, would be usual. Was half of it read?',
    whole:
      '{point} comes to {read} doubled; {meant} by itself would be usual. Was the whole entered as the half?',
  },
  run: (sheet, raise) => {
    for (const { point, mention, range, readings } of readPoints(sheet)) {
      for (const reading of readings) {
        const found = explain(reading, point, range);
        if (found.cause !== 'half' && found.cause !== 'whole') continue;
        raise(found.cause, { point: mention, read: reading.length, meant: found.meant });
        break;
      }
    }
  },
});
