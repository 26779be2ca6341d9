import { read } from '../testing/sample-readings.js';
import { testCheck } from '../testing/test-check.js';
import { levelNotSaid } from './level-not-said.js';

testCheck(levelNotSaid, {
  quiet: [
    { name: 'a level that was said', readings: [read('waist', 612, { levelFoundBy: 'nicks' })] },
    {
      name: 'a level said in one round of two',
      readings: [read('waist', 612, { levelFoundBy: 'seam' }), read('waist', 613, { round: 2 })],
    },
    { name: 'a point without a level', readings: { 'across-back': 320 } },
  ],
  raises: [
    {
      name: 'bust and waist by themselves, once for the sheet',
      readings: { bust: 850, waist: 612, 'across-back': 320 },
      says: 'How the level was found is not said: bust or chest (850 mm) and waist (612 mm).',
      severity: 'note',
      points: ['bust', 'waist'],
    },
  ],
});
