import { inTapeLengths, read, rounds } from '../testing/sample-readings.js';
import { testCheck } from '../testing/test-check.js';
import { transposedDigits } from './transposed-digits.js';

testCheck(transposedDigits, {
  quiet: [
    { name: 'one reading', readings: { waist: 612 } },
    { name: 'two readings that agree', readings: rounds('waist', 612, 614) },
    { name: 'neighbouring digits, within what is allowed', readings: rounds('waist', 612, 612) },
    { name: 'readings that differ otherwise', readings: rounds('waist', 612, 641) },
    { name: 'digits apart from one another', readings: rounds('waist', 612, 216) },
    { name: 'one more digit', readings: rounds('waist', 612, 6120) },
    {
      name: 'two sleeves',
      readings: [read('sleeve-outer', 612, { worn: 'left' }), read('sleeve-outer', 621, { worn: 'right' })],
    },
    {
      name: 'other counts of tapes',
      kind: 'skirt',
      readings: [inTapeLengths('hem', 2, 742), inTapeLengths('hem', 3, 724, 2)],
    },
  ],
  raises: [
    {
      name: '612 and 621',
      readings: rounds('waist', 612, 621),
      says: 'Waist reads 612 mm in one round and 621 mm in another. Did two digits change places?',
      severity: 'question',
      points: ['waist'],
    },
    {
      name: 'inches and a fraction apart by its digits',
      readings: [
        read('waist', '617.22', { typed: '24.3', unit: 'in' }),
        read('waist', '1074.42', { typed: '42.3', unit: 'in', round: 2 }),
      ],
      says: 'Waist reads 617.2 mm in one round and 1074.4 mm in another. Did two digits change places?',
      severity: 'question',
      points: ['waist'],
    },
    {
      name: 'the rest of a hem',
      kind: 'skirt',
      readings: [inTapeLengths('hem', 3, 742), inTapeLengths('hem', 3, 724, 2)],
      says: 'Hem reads 5242 mm in one round and 5224 mm in another. Did two digits change places?',
      severity: 'question',
      points: ['hem'],
    },
  ],
});
