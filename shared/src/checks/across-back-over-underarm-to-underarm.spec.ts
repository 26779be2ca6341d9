import { testCheck } from '../testing/test-check.js';
import { acrossBackOverUnderarmToUnderarm } from './across-back-over-underarm-to-underarm.js';

testCheck(acrossBackOverUnderarmToUnderarm, {
  quiet: [
    {
      name: 'the underarms further apart',
      readings: { 'across-back': 310, 'underarm-to-underarm-back': 402 },
    },
    { name: 'both alike', readings: { 'across-back': 350, 'underarm-to-underarm-back': 350 } },
    { name: 'only one of them', readings: { 'across-back': 350 } },
  ],
  raises: [
    {
      name: 'the back wider between the sleeves',
      readings: { 'across-back': 402, 'underarm-to-underarm-back': 310 },
      says: 'Across the back, 402 mm, is more than underarm to underarm, 310 mm. Dropped shoulders or side seams set to the back would explain it.',
      severity: 'question',
      points: ['across-back', 'underarm-to-underarm-back'],
    },
  ],
});
