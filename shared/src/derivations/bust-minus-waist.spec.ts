import { expect, it } from 'vitest';
import { derivedOf } from '../testing/derived-of.js';
import { bustMinusWaist } from './bust-minus-waist.js';

it('is what the bust has over the waist', () => {
  expect(derivedOf(bustMinusWaist, { bust: 842, waist: 612 }).worked).toBe('842 mm − 612 mm = 230 mm');
});

it('takes the chest of a coat with the coat’s own waist', () => {
  expect(derivedOf(bustMinusWaist, { 'coat-chest': 960, 'coat-waist': 850 }).worked).toBe(
    '960 mm − 850 mm = 110 mm',
  );
});
