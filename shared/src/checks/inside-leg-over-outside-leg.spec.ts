import { testCheck } from '../testing/test-check.js';
import { insideLegOverOutsideLeg } from './inside-leg-over-outside-leg.js';

testCheck(insideLegOverOutsideLeg, {
  quiet: [
    { name: 'a rise between them', kind: 'trousers', readings: { 'outside-leg': 1080, 'inside-leg': 790 } },
  ],
  raises: [
    {
      name: 'the two exchanged',
      kind: 'trousers',
      readings: { 'outside-leg': 790, 'inside-leg': 1080 },
      says: 'The inside leg, 1080 mm, is not shorter than the outside leg, 790 mm. Were the two exchanged?',
      severity: 'stop',
      points: ['inside-leg', 'outside-leg'],
    },
    {
      name: 'no rise at all',
      kind: 'breeches',
      readings: { 'outside-leg': 600, 'inside-leg': 600 },
      says: 'The inside leg, 600 mm, is not shorter than the outside leg, 600 mm. Were the two exchanged?',
      severity: 'stop',
      points: ['inside-leg', 'outside-leg'],
    },
  ],
});
