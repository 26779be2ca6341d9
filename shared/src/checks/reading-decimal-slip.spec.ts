import { read } from '../testing/sample-readings.js';
import { testCheck } from '../testing/test-check.js';
import { readingDecimalSlip } from './reading-decimal-slip.js';

testCheck(readingDecimalSlip, {
  quiet: [
    { name: 'a usual waist', readings: { waist: 612 } },
    { name: 'a reading that no slip explains', readings: { waist: 1400 } },
    { name: 'a deep point, beyond its range by less than half again', readings: { 'point-depth': 250 } },
    { name: 'a narrow rolled hem, not far under its range', kind: 'skirt', readings: { 'hem-depth': '2.5' } },
    {
      name: 'a slip that was corrected',
      readings: [read('waist', 61, { stands: false }), read('waist', 612, { round: 2 })],
    },
    { name: 'a point the catalogue does not know', readings: { 'no-such-point': 3 } },
  ],
  raises: [
    {
      name: 'centimetres read in place of millimetres',
      readings: { waist: 61 },
      says: 'Waist reads 61 mm; 610 mm would be usual. Were centimetres read, or did the decimal point slip?',
      severity: 'question',
      points: ['waist'],
    },
    {
      name: 'a digit too many',
      readings: { waist: 6120 },
      says: 'Waist reads 6120 mm; 612 mm would be usual. Is there a digit too many, or did the decimal point slip?',
      severity: 'question',
      points: ['waist'],
    },
    {
      name: 'inches read in place of millimetres',
      readings: { waist: 24 },
      says: 'Waist reads 24 mm; 609.6 mm would be usual. Were inches read?',
      severity: 'question',
      points: ['waist'],
    },
    {
      name: 'millimetres entered in a field of inches',
      readings: [read('waist', '15544.8', { typed: '612', unit: 'in' })],
      says: 'Waist reads 15544.8 mm; 612 mm would be usual. Were millimetres entered as inches?',
      severity: 'question',
      points: ['waist'],
    },
    {
      name: 'one slip among the rounds, once for the point',
      readings: [read('waist', 612), read('waist', 61, { round: 2 }), read('waist', 62, { round: 3 })],
      says: 'Waist reads 61 mm; 610 mm would be usual. Were centimetres read, or did the decimal point slip?',
      severity: 'question',
      points: ['waist'],
    },
  ],
});
