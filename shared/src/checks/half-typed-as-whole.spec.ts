import { testCheck } from '../testing/test-check.js';
import { halfTypedAsWhole } from './half-typed-as-whole.js';

testCheck(halfTypedAsWhole, {
  quiet: [
    { name: 'a usual waist', readings: { waist: 612 } },
    { name: 'a waist a little under the usual', readings: { waist: 440 } },
    { name: 'a slip of the unit, which has its own check', readings: { waist: 61 } },
    { name: 'a length, which has no half', kind: 'dress', readings: { 'neck-to-hem-back': 700 } },
  ],
  raises: [
    {
      name: 'half the waist read flat and not doubled',
      readings: { waist: 306 },
      says: 'Waist reads 306 mm; twice that, 612 mm, would be usual. Was half of it read?',
      severity: 'question',
      points: ['waist'],
    },
    {
      name: 'half the back read from the centre seam',
      readings: { 'across-back': 155 },
      says: 'Across the back reads 155 mm; twice that, 310 mm, would be usual. Was half of it read?',
      severity: 'question',
      points: ['across-back'],
    },
    {
      name: 'the whole entered where the half is wanted',
      kind: 'trousers',
      readings: { seat: 2040 },
      says: 'Seat comes to 2040 mm doubled; 1020 mm by itself would be usual. Was the whole entered as the half?',
      severity: 'question',
      points: ['seat'],
    },
  ],
});
