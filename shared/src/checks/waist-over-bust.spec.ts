import { testCheck } from '../testing/test-check.js';
import { waistOverBust } from './waist-over-bust.js';

testCheck(waistOverBust, {
  quiet: [
    { name: 'a waist smaller than the bust', readings: { bust: 842, waist: 612 } },
    { name: 'both alike, as in a straight 1920s dress', kind: 'dress', readings: { bust: 900, waist: 900 } },
    { name: 'a waist by itself', readings: { waist: 612 } },
    {
      name: 'a child, whose waist may be the larger',
      kind: 'child-dress',
      readings: { 'child-chest': 500, 'child-waist': 540 },
    },
  ],
  raises: [
    {
      name: 'a bodice whose two figures were exchanged',
      readings: { bust: 612, waist: 842 },
      says: 'With everything fastened the waist, 842 mm, is larger than the bust or chest, 612 mm.',
      severity: 'question',
      points: ['waist', 'bust'],
    },
    {
      name: 'a coat',
      kind: 'coat',
      readings: { 'coat-chest': 900, 'coat-waist': '900.5' },
      says: 'With everything fastened the waist, 900.5 mm, is larger than the bust or chest, 900 mm.',
      severity: 'question',
      points: ['coat-waist', 'coat-chest'],
    },
  ],
});
