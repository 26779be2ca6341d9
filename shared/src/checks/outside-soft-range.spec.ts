import { read } from '../testing/sample-readings.js';
import { testCheck } from '../testing/test-check.js';
import { outsideSoftRange } from './outside-soft-range.js';

testCheck(outsideSoftRange, {
  quiet: [
    { name: 'both ends of the range', readings: [read('waist', 460), read('waist', 1100, { round: 2 })] },
    { name: 'a long train', kind: 'dress', readings: { 'neck-to-hem-back': 3400 } },
    { name: 'a bodice, which is no short dress', kind: 'bodice', readings: { 'neck-to-hem-back': 420 } },
    { name: 'what a slip or a half explains', readings: { waist: 61, bust: 421 } },
  ],
  raises: [
    {
      name: 'a waist far above the usual',
      readings: { waist: 1400 },
      says: 'Waist reads 1400 mm; 1100 mm or less is usual. Read it again, or say why it is so large.',
      severity: 'question',
      points: ['waist'],
    },
    {
      name: 'a bodice’s length on a dress',
      kind: 'dress',
      readings: { 'neck-to-hem-back': 620 },
      says: 'Neck to hem, back reads 620 mm; 850 mm or more is usual. Read it again, or say why it is so small.',
      severity: 'question',
      points: ['neck-to-hem-back'],
    },
    {
      name: 'a waist a little under the usual',
      readings: { waist: 440 },
      says: 'Waist reads 440 mm, a little under the usual 460 mm or more.',
      severity: 'note',
      points: ['waist'],
    },
    {
      name: 'a waist a tenth over the usual',
      readings: { waist: 1210 },
      says: 'Waist reads 1210 mm, a little over the usual 1100 mm or less.',
      severity: 'note',
      points: ['waist'],
    },
  ],
});
