import { isLonger, times } from '../units/length.js';
import { sheetCheck } from './check.js';
import { readPoints } from './sheet-view.js';

export const gapOverATenth = sheetCheck({
  id: 'gap-over-a-tenth',
  title: 'Gap larger than a tenth of the girth',
  about:
    'A gap between edges that could not be brought together, larger than a tenth of what it was taken off.',
  severity: 'question',
  messages: {
    large:
      '{point} comes to {read} with a gap of {gap} taken off, more than a tenth of it. Is the gap right?',
  },
  run: (sheet, raise) => {
    for (const { mention, readings } of readPoints(sheet)) {
      const wide = readings.find(({ gap, length }) => gap !== undefined && isLonger(times(gap, 10), length));
      if (wide?.gap) raise('large', { point: mention, read: wide.length, gap: wide.gap });
    }
  },
});
