import { inTapeLengths, read, rounds } from '../testing/sample-readings.js';
import { testCheck } from '../testing/test-check.js';
import { roundsApart } from './rounds-apart.js';

testCheck(roundsApart, {
  quiet: [
    { name: 'one reading', readings: { waist: 612 } },
    { name: 'two readings 3 mm apart', readings: rounds('waist', 612, 615) },
    { name: 'two readings above a metre, 5 mm apart', readings: rounds('hip', 1001, 1006), kind: 'skirt' },
    {
      name: 'a hem with three joins, 11 mm apart',
      kind: 'skirt',
      readings: [inTapeLengths('hem', 3, 742), inTapeLengths('hem', 3, 753, 2)],
    },
    { name: 'a doubled reading 6 mm apart, 3 mm on the half', readings: rounds('elbow', 290, 296) },
    {
      name: 'a round read flat and doubled, 6 mm apart',
      readings: [
        read('waist', 612, { method: 'flat-doubled' }),
        read('waist', 618, { method: 'flat-doubled', round: 2 }),
      ],
    },
    {
      name: 'two sleeves, each read once',
      readings: [read('sleeve-outer', 600, { worn: 'left' }), read('sleeve-outer', 625, { worn: 'right' })],
    },
    {
      name: 'a reading that was corrected',
      readings: [read('waist', 512, { stands: false }), read('waist', 612, { round: 2 })],
    },
  ],
  raises: [
    {
      name: 'two readings 4 mm apart',
      readings: rounds('waist', 612, 616),
      says: 'The readings of waist differ by 4 mm; 3 mm is allowed. Read it once more.',
      severity: 'question',
      points: ['waist'],
    },
    {
      name: 'the left sleeve, not the right',
      readings: [
        read('sleeve-outer', 600, { worn: 'left' }),
        read('sleeve-outer', 612, { worn: 'left', round: 2 }),
        read('sleeve-outer', 600, { worn: 'right' }),
      ],
      says: 'The readings of left sleeve, outer length differ by 12 mm; 3 mm is allowed. Read it once more.',
      severity: 'question',
      points: ['sleeve-outer'],
    },
    {
      name: 'a third reading far off',
      readings: rounds('waist', 612, 613, 640),
      says: 'The readings of waist differ by 28 mm; 3 mm is allowed. Read it once more.',
      severity: 'question',
      points: ['waist'],
    },
    {
      name: 'a hem with three joins, 12 mm apart',
      kind: 'skirt',
      readings: [inTapeLengths('hem', 3, 742), inTapeLengths('hem', 3, 754, 2)],
      says: 'The readings of hem differ by 12 mm; 11 mm is allowed. Read it once more.',
      severity: 'question',
      points: ['hem'],
    },
  ],
});
