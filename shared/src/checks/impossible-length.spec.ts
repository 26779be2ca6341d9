import { read } from '../testing/sample-readings.js';
import { testCheck } from '../testing/test-check.js';
import { impossibleLength } from './impossible-length.js';

testCheck(impossibleLength, {
  quiet: [
    { name: 'a reading of nothing', readings: { 'point-depth': 0 } },
    { name: 'a hundred metres', readings: { waist: 100_000 } },
    { name: 'a reading that was taken back', readings: [read('waist', -3, { stands: false })] },
  ],
  raises: [
    {
      name: 'a gap larger than the reading',
      readings: [read('waist', -12), read('waist', -13, { round: 2 })],
      says: 'Waist comes out at −12 mm, less than nothing. Look at the zero of the tape and at the gap.',
      severity: 'stop',
      points: ['waist'],
    },
    {
      name: 'a key held down',
      readings: { waist: 6_122_222 },
      says: 'Waist reads 6122222 mm, longer than anything in dress. Read it again.',
      severity: 'stop',
      points: ['waist'],
    },
  ],
});
