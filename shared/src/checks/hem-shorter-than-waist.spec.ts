import { testCheck } from '../testing/test-check.js';
import { hemShorterThanWaist } from './hem-shorter-than-waist.js';

testCheck(hemShorterThanWaist, {
  quiet: [
    { name: 'a full skirt', kind: 'skirt', readings: { hem: 5242, waistband: 600 } },
    { name: 'a hem as long as the waist', kind: 'skirt', readings: { hem: 900, waistband: 900 } },
    { name: 'no waist read', kind: 'skirt', readings: { hem: 300 } },
  ],
  raises: [
    {
      name: 'a hem of which only the rest was entered',
      kind: 'skirt',
      readings: { hem: 542, waistband: 600 },
      says: 'The hem, 542 mm, is shorter round than the waist, 600 mm. Were the tape lengths counted?',
      severity: 'stop',
      points: ['hem', 'waistband'],
    },
    {
      name: 'a dress, by its waist seam',
      kind: 'dress',
      readings: { hem: 542, waist: 601 },
      says: 'The hem, 542 mm, is shorter round than the waist, 601 mm. Were the tape lengths counted?',
      severity: 'stop',
      points: ['hem', 'waist'],
    },
  ],
});
