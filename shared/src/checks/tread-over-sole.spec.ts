import { testCheck } from '../testing/test-check.js';
import { treadOverSole } from './tread-over-sole.js';

testCheck(treadOverSole, {
  quiet: [{ name: 'a shoe', kind: 'shoe', readings: { tread: 66, sole: 240 } }],
  raises: [
    {
      name: 'the two exchanged',
      kind: 'shoe',
      readings: { tread: 240, sole: 66 },
      says: 'The tread, 240 mm, is not shorter than the sole, 66 mm. Were the two exchanged?',
      severity: 'stop',
      points: ['tread', 'sole'],
    },
    {
      name: 'the same figure twice',
      kind: 'shoe',
      readings: { tread: 110, sole: 110 },
      says: 'The tread, 110 mm, is not shorter than the sole, 110 mm. Were the two exchanged?',
      severity: 'stop',
      points: ['tread', 'sole'],
    },
  ],
});
