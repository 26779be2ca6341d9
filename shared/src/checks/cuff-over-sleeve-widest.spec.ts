import { testCheck } from '../testing/test-check.js';
import { cuffOverSleeveWidest } from './cuff-over-sleeve-widest.js';

testCheck(cuffOverSleeveWidest, {
  quiet: [
    { name: 'a full sleeve on a close cuff', readings: { cuff: 190, 'sleeve-widest': 820 } },
    { name: 'a pagoda sleeve, widest at its edge', readings: { cuff: 780, 'sleeve-widest': 780 } },
  ],
  raises: [
    {
      name: 'a sleeve that was not doubled',
      readings: { cuff: 290, 'sleeve-widest': 260 },
      says: 'The cuff, 290 mm, is larger than the sleeve at its widest, 260 mm. Was the sleeve doubled?',
      severity: 'question',
      points: ['cuff', 'sleeve-widest'],
    },
  ],
});
