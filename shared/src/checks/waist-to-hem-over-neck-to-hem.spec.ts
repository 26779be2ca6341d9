import { testCheck } from '../testing/test-check.js';
import { waistToHemOverNeckToHem } from './waist-to-hem-over-neck-to-hem.js';

testCheck(waistToHemOverNeckToHem, {
  quiet: [
    { name: 'a dress', kind: 'dress', readings: { 'neck-to-hem-back': 1400, 'waist-to-hem-back': 1020 } },
    {
      name: 'front and back that are not each other’s measure',
      kind: 'dress',
      readings: { 'neck-to-hem-front': 1300, 'waist-to-hem-back': 1350 },
    },
  ],
  raises: [
    {
      name: 'front and back exchanged on the sheet',
      kind: 'dress',
      readings: {
        'neck-to-hem-front': 1020,
        'waist-to-hem-front': 1380,
        'neck-to-hem-back': 1020,
        'waist-to-hem-back': 1400,
      },
      says: [
        'In front, waist to hem, 1380 mm, is not shorter than neck to hem, 1020 mm.',
        'At the back, waist to hem, 1400 mm, is not shorter than neck to hem, 1020 mm.',
      ],
      severity: 'stop',
      points: ['waist-to-hem-front', 'neck-to-hem-front', 'waist-to-hem-back', 'neck-to-hem-back'],
    },
    {
      name: 'the same figure twice',
      readings: { 'neck-to-hem-back': 420, 'waist-to-hem-back': 420 },
      says: 'At the back, waist to hem, 420 mm, is not shorter than neck to hem, 420 mm.',
      severity: 'stop',
      points: ['waist-to-hem-back', 'neck-to-hem-back'],
    },
  ],
});
