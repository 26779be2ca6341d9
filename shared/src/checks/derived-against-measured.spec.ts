import { testCheck } from '../testing/test-check.js';
import { derivedAgainstMeasured } from './derived-against-measured.js';

const lengths = { 'neck-to-hem-back': 1400, 'waist-to-hem-back': 1020 };

testCheck(derivedAgainstMeasured, {
  quiet: [
    { name: 'a point that was only worked out', kind: 'dress', readings: lengths },
    { name: 'a point that was only measured', kind: 'dress', readings: { 'neck-to-waist-back': 380 } },
    { name: '8 mm apart', kind: 'dress', readings: { ...lengths, 'neck-to-waist-back': 388 } },
  ],
  raises: [
    {
      name: '9 mm apart, where each is known to 2 mm',
      kind: 'dress',
      readings: { ...lengths, 'neck-to-waist-back': 389 },
      says: 'Neck to waist, back was read as 389 mm, but works out at 380 mm, 9 mm apart; 8 mm is allowed.',
      severity: 'question',
      points: ['neck-to-waist-back'],
    },
  ],
});
