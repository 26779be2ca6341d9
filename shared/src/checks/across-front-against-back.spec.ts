import { testCheck } from '../testing/test-check.js';
import { acrossFrontAgainstBack } from './across-front-against-back.js';

testCheck(acrossFrontAgainstBack, {
  quiet: [{ name: '80 mm apart', readings: { 'across-front': 380, 'across-back': 300 } }],
  raises: [
    {
      name: '81 mm apart',

      readings: { 'across-front': 381, 'across-back': 300 },
      says: 'Across the front reads 381 mm and across the back 300 mm, 81 mm apart.',
      severity: 'note',
      points: ['across-front', 'across-back'],
    },
  ],
});
