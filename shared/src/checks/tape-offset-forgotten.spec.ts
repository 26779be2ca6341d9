import type { TakenReading } from '../readings/reading.js';
import { inTapeLengths, rounds } from '../testing/sample-readings.js';
import { testCheck } from '../testing/test-check.js';
import { tapeOffsetForgotten } from './tape-offset-forgotten.js';

const twice = (offsetsMm: readonly number[], more: readonly TakenReading[] = []) => [
  ...offsetsMm.flatMap((offset, index) => {
    const pointId = ['bust', 'waist', 'neck', 'armscye', 'cuff', 'across-back'][index] ?? 'hem';
    return rounds(pointId, 400 + 37 * index, 400 + 37 * index + offset);
  }),
  ...more,
];

testCheck(tapeOffsetForgotten, {
  quiet: [
    { name: 'rounds that agree', readings: twice([1, -1, 0, 2]) },
    { name: 'two points off alike', readings: twice([5, 5]) },
    { name: 'points off in different ways', readings: twice([5, -4, 9, 0]) },
    { name: 'points off by what hands do', readings: twice([2, 2, 2, 2]) },
    { name: 'points off alike, but fewer than three in four', readings: twice([5, 5, 5, 0, -1]) },
    { name: 'a single round', readings: { bust: 850, waist: 612, neck: 400 } },
  ],
  raises: [
    {
      name: 'a second tape that begins 5 mm late',
      readings: twice([5, 5, 4, 6, 0]),
      says: 'At 4 of the 5 points read twice the second round is 5 mm longer each time the tape was laid. Was the zero of one tape forgotten?',
      severity: 'question',
      points: [],
    },
    {
      name: 'a hem that had it four times, and an elbow that had it twice',
      kind: 'dress',
      readings: twice(
        [-5, -5],
        [inTapeLengths('hem', 3, 742), inTapeLengths('hem', 3, 722, 2), ...rounds('elbow', 320, 310)],
      ),
      says: 'At 4 of the 4 points read twice the second round is 5 mm shorter each time the tape was laid. Was the zero of one tape forgotten?',
      severity: 'question',
      points: [],
    },
  ],
});
