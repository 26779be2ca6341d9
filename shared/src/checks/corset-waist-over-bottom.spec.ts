import { testCheck } from '../testing/test-check.js';
import { corsetWaistOverBottom } from './corset-waist-over-bottom.js';

testCheck(corsetWaistOverBottom, {
  quiet: [
    {
      name: 'a waist smaller than the edge',
      kind: 'corset',
      readings: { 'corset-waist-closed': 540, 'corset-bottom': 820 },
    },
  ],
  raises: [
    {
      name: 'the two exchanged',
      kind: 'corset',
      readings: { 'corset-waist-closed': 820, 'corset-bottom': 640 },
      says: 'The closed waist of the corset, 820 mm, is larger than its bottom edge, 640 mm. Were the two exchanged?',
      severity: 'question',
      points: ['corset-waist-closed', 'corset-bottom'],
    },
  ],
});
