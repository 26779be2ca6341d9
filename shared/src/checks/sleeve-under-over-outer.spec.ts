import { testCheck } from '../testing/test-check.js';
import { sleeveUnderOverOuter } from './sleeve-under-over-outer.js';

testCheck(sleeveUnderOverOuter, {
  quiet: [{ name: 'the outer longer', readings: { 'sleeve-outer': 610, 'sleeve-under': 430 } }],
  raises: [
    {
      name: 'the two exchanged',
      readings: { 'sleeve-outer': 430, 'sleeve-under': 510 },
      says: 'The sleeve reads 510 mm beneath and 430 mm outside. Were the two exchanged?',
      severity: 'question',
      points: ['sleeve-under', 'sleeve-outer'],
    },
  ],
});
