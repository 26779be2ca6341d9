import { testCheck } from '../testing/test-check.js';
import { palmOverGloveLength } from './palm-over-glove-length.js';

testCheck(palmOverGloveLength, {
  quiet: [
    { name: 'a glove', kind: 'glove', readings: { palm: 180, 'glove-length': 300 } },
    {
      name: 'a short glove, rounder than it is long',
      kind: 'glove',
      readings: { palm: 220, 'glove-length': 200 },
    },
  ],
  raises: [
    {
      name: 'the two exchanged',
      kind: 'glove',
      readings: { palm: 600, 'glove-length': 90 },
      says: 'Laid flat, the palm is 300 mm wide (600 mm round), and the glove is 90 mm long. Were the two exchanged?',
      severity: 'question',
      points: ['palm', 'glove-length'],
    },
  ],
});
