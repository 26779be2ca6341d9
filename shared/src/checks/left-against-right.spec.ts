import { read } from '../testing/sample-readings.js';
import { testCheck } from '../testing/test-check.js';
import { leftAgainstRight } from './left-against-right.js';

const pair = (pointId: string, leftMm: number, rightMm: number) => [
  read(pointId, leftMm, { worn: 'left' }),
  read(pointId, rightMm, { worn: 'right' }),
];

testCheck(leftAgainstRight, {
  quiet: [
    { name: 'one side read', readings: [read('sleeve-outer', 600, { worn: 'left' })] },
    { name: 'a side that was not said', readings: [read('cuff', 200), read('cuff', 260, { worn: 'left' })] },
    { name: '15 mm apart, five times what two readings may be', readings: pair('sleeve-outer', 600, 615) },
    { name: 'a doubled point 30 mm apart', readings: pair('elbow', 300, 330) },
  ],
  raises: [
    {
      name: 'a sleeve 16 mm longer than the other',
      readings: pair('sleeve-outer', 616, 600),
      says: 'Sleeve, outer length reads 616 mm at the left and 600 mm at the right, as worn, 16 mm apart. Is it so?',
      severity: 'question',
      points: ['sleeve-outer'],
    },
    {
      name: 'the legs of trousers, one of them turned up',
      kind: 'trousers',
      readings: pair('outside-leg', 1060, 1010),
      says: 'Outside leg reads 1060 mm at the left and 1010 mm at the right, as worn, 50 mm apart. Is it so?',
      severity: 'question',
      points: ['outside-leg'],
    },
  ],
});
