import { testCheck } from '../testing/test-check.js';
import { sleeveOverCentreBackToCuff } from './sleeve-over-centre-back-to-cuff.js';

testCheck(sleeveOverCentreBackToCuff, {
  quiet: [{ name: 'a coat', kind: 'coat', readings: { 'sleeve-outer': 660, 'centre-back-to-cuff': 840 } }],
  raises: [
    {
      name: 'the two exchanged',
      kind: 'coat',
      readings: { 'sleeve-outer': 840, 'centre-back-to-cuff': 660 },
      says: 'The sleeve, 840 mm, is not shorter than centre back to cuff, 660 mm, which it is a part of.',
      severity: 'question',
      points: ['sleeve-outer', 'centre-back-to-cuff'],
    },
  ],
});
