import { inTapeLengths } from '../testing/sample-readings.js';
import { testCheck } from '../testing/test-check.js';
import { restLongerThanTape } from './rest-longer-than-tape.js';

testCheck(restLongerThanTape, {
  quiet: [
    { name: 'three tapes and a rest', kind: 'skirt', readings: [inTapeLengths('hem', 3, 742)] },
    { name: 'a rest as long as the tape', kind: 'skirt', readings: [inTapeLengths('hem', 2, 1500)] },
    { name: 'no tapes', kind: 'skirt', readings: { hem: 3400 } },
  ],
  raises: [
    {
      name: 'the whole keyed as the rest',
      kind: 'skirt',
      readings: [inTapeLengths('hem', 2, 3742)],
      says: 'Hem has a rest of 3742 mm after whole tapes of 1500 mm; a rest cannot be longer than the tape.',
      severity: 'stop',
      points: ['hem'],
    },
  ],
});
