import { testCheck } from '../testing/test-check.js';
import { hoopsOutOfOrder } from './hoops-out-of-order.js';

const kind = 'crinoline';

testCheck(hoopsOutOfOrder, {
  quiet: [
    {
      name: 'hoops that widen downwards',
      kind,
      readings: {
        'crinoline-top-hoop-round': 1200,
        'crinoline-middle-hoop-round': 1900,
        'crinoline-base-round': 2500,
      },
    },
    {
      name: 'a cage of one width',
      kind,
      readings: { 'crinoline-top-hoop-round': 1500, 'crinoline-base-round': 1500 },
    },
    { name: 'the base alone', kind, readings: { 'crinoline-base-round': 2500 } },
  ],
  raises: [
    {
      name: 'middle and top exchanged',
      kind,
      readings: {
        'crinoline-top-hoop-round': 1900,
        'crinoline-middle-hoop-round': 1200,
        'crinoline-base-round': 2500,
      },
      says: 'Top hoop, round, 1900 mm, is larger than middle hoop, round, 1200 mm. Cages widen downwards: were the hoops exchanged?',
      severity: 'question',
      points: ['crinoline-top-hoop-round', 'crinoline-middle-hoop-round'],
    },
    {
      name: 'top and base exchanged, the middle not read',
      kind,
      readings: { 'crinoline-top-hoop-round': 2500, 'crinoline-base-round': 1200 },
      says: 'Top hoop, round, 2500 mm, is larger than base hoop, round, 1200 mm. Cages widen downwards: were the hoops exchanged?',
      severity: 'question',
      points: ['crinoline-top-hoop-round', 'crinoline-base-round'],
    },
  ],
});
