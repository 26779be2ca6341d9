import { testCheck } from '../testing/test-check.js';
import { backWaistOverFullBack } from './back-waist-over-full-back.js';

testCheck(backWaistOverFullBack, {
  quiet: [
    {
      name: 'a coat with skirts',
      kind: 'coat',
      readings: { 'coat-back-waist': 430, 'coat-full-back': 1000 },
    },
    {
      name: 'a coat that ends at the waist',
      kind: 'coat',
      readings: { 'coat-back-waist': 430, 'coat-full-back': 430 },
    },
  ],
  raises: [
    {
      name: 'the two exchanged',
      kind: 'coat',
      readings: { 'coat-back-waist': 1000, 'coat-full-back': 430 },
      says: 'The back waist, 1000 mm, is longer than the full back, 430 mm. Were the two exchanged?',
      severity: 'stop',
      points: ['coat-back-waist', 'coat-full-back'],
    },
  ],
});
