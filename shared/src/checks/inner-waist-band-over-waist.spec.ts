import { testCheck } from '../testing/test-check.js';
import { innerWaistBandOverWaist } from './inner-waist-band-over-waist.js';

testCheck(innerWaistBandOverWaist, {
  quiet: [
    { name: 'the band smaller, as it usually is', readings: { 'inner-waist-band': 596, waist: 612 } },
    { name: 'the band alike', readings: { 'inner-waist-band': 612, waist: 612 } },
  ],
  raises: [
    {
      name: 'the band larger',
      readings: { 'inner-waist-band': 640, waist: 612 },
      says: 'The inner waist band, 640 mm, is larger than the waist, 612 mm. It usually is the smaller.',
      severity: 'note',
      points: ['inner-waist-band', 'waist'],
    },
  ],
});
