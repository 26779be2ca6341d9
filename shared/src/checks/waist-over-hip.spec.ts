import { testCheck } from '../testing/test-check.js';
import { waistOverHip } from './waist-over-hip.js';

testCheck(waistOverHip, {
  quiet: [
    {
      name: 'trousers cut full in the seat',
      kind: 'trousers',
      readings: { 'trouser-waistband': 840, seat: 1060 },
    },
    { name: 'a waistband by itself', kind: 'trousers', readings: { 'trouser-waistband': 840 } },
  ],
  raises: [
    {
      name: 'a seat that was not doubled',
      kind: 'trousers',
      readings: { 'trouser-waistband': 840, seat: 530 },
      says: 'The waistband, 840 mm, is larger than the hip or seat, 530 mm. Was the half doubled?',
      severity: 'question',
      points: ['trouser-waistband', 'seat'],
    },
  ],
});
