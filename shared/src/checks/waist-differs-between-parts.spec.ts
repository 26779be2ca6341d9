import { read } from '../testing/sample-readings.js';
import { testCheck } from '../testing/test-check.js';
import { waistDiffersBetweenParts } from './waist-differs-between-parts.js';

const skirt = (waistbandMm: number) =>
  ({ kind: 'skirt', readings: [read('waistband', waistbandMm)] }) as const;

testCheck(waistDiffersBetweenParts, {
  quiet: [
    { name: 'a bodice by itself', readings: { waist: 612 } },
    { name: 'a band 60 mm larger', readings: { waist: 612 }, others: [skirt(672)] },
    {
      name: 'a part that is no skirt',
      readings: { waist: 612 },
      others: [{ kind: 'petticoat', readings: [read('waistband', 800)] }],
    },
    { name: 'a coat and a skirt', kind: 'coat', readings: { 'coat-waist': 900 }, others: [skirt(600)] },
  ],
  raises: [
    {
      name: 'a band 61 mm larger than the waist of the bodice',
      readings: { waist: 612 },
      others: [skirt(673)],
      says: 'The waist reads 612 mm, the waistband of the other part 673 mm, 61 mm apart. Do the parts belong together, and which was worn over which?',
      severity: 'note',
      points: ['waist', 'waistband'],
    },
    {
      name: 'the skirt’s sheet, against the band inside the bodice',
      kind: 'skirt',
      readings: { waistband: 700 },
      others: [{ kind: 'bodice', readings: [read('waist', 700), read('inner-waist-band', 600)] }],
      says: 'The waistband reads 700 mm, the inner waist band of the other part 600 mm, 100 mm apart. Do the parts belong together, and which was worn over which?',
      severity: 'note',
      points: ['waistband', 'inner-waist-band'],
    },
  ],
});
