import { testCheck } from '../testing/test-check.js';
import { brimSidesDiffer } from './brim-sides-differ.js';

testCheck(brimSidesDiffer, {
  quiet: [{ name: 'a centimetre apart', kind: 'hat', readings: { 'brim-left': 50, 'brim-right': 60 } }],
  raises: [
    {
      name: 'one side cut wider',
      kind: 'hat',
      readings: { 'brim-left': 48, 'brim-right': 95 },
      says: 'The brim reads 48 mm at the left and 95 mm at the right, 47 mm apart. Is it rolled, or cut so?',
      severity: 'note',
      points: ['brim-left', 'brim-right'],
    },
  ],
});
