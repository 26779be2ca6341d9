import { notTaken, read } from '../testing/sample-readings.js';
import { testCheck } from '../testing/test-check.js';
import { requiredMissingWithoutReason } from './required-missing-without-reason.js';

const corset = { 'corset-waist-closed': 540, 'corset-top': 800, 'corset-bottom': 820, busk: 330 };
const gloves = { kind: 'glove' } as const;

testCheck(requiredMissingWithoutReason, {
  quiet: [
    { name: 'everything read', ...gloves, readings: { palm: 180, 'glove-length': 300 } },
    {
      name: 'a reason given',
      ...gloves,
      readings: [read('palm', 180), notTaken('glove-length', 'too-fragile')],
    },
    { name: 'an optional point left out', kind: 'corset', readings: corset },
  ],
  raises: [
    {
      name: 'a point not read',
      ...gloves,
      readings: { palm: 180 },
      says: 'Glove length has not been read. Read it, or say why it cannot be taken.',
      severity: 'stop',
      points: ['glove-length'],
    },
    {
      name: 'a point left out without a reason',
      ...gloves,
      readings: [read('palm', 180), notTaken('glove-length')],
      says: 'Glove length is marked as not taken, without a reason.',
      severity: 'stop',
      points: ['glove-length'],
    },
    {
      name: 'a reading that was taken back',
      ...gloves,
      readings: [read('palm', 180), read('glove-length', 300, { stands: false })],
      says: 'Glove length has not been read. Read it, or say why it cannot be taken.',
      severity: 'stop',
      points: ['glove-length'],
    },
  ],
});
