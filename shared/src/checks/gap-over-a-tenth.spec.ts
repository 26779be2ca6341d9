import { read } from '../testing/sample-readings.js';
import { testCheck } from '../testing/test-check.js';
import { mm } from '../units/length.js';
import { gapOverATenth } from './gap-over-a-tenth.js';

testCheck(gapOverATenth, {
  quiet: [
    { name: 'no gap', readings: { waist: 612 } },
    { name: 'a tenth', readings: [read('waist', 610, { gap: mm(61) })] },
  ],
  raises: [
    {
      name: 'more than a tenth',
      readings: [read('waist', 610, { gap: mm(62) })],
      says: 'Waist comes to 610 mm with a gap of 62 mm taken off, more than a tenth of it. Is the gap right?',
      severity: 'question',
      points: ['waist'],
    },
    {
      name: 'the left cuff',
      readings: [read('cuff', 200, { gap: mm(30), worn: 'left' })],
      says: 'Left cuff comes to 200 mm with a gap of 30 mm taken off, more than a tenth of it. Is the gap right?',
      severity: 'question',
      points: ['cuff'],
    },
  ],
});
