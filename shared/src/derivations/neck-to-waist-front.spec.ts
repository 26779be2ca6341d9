import { expect, it } from 'vitest';
import { derivedOf } from '../testing/derived-of.js';
import { neckToWaistFront } from './neck-to-waist-front.js';

it('takes the waist to hem off the neck to hem, in front', () => {
  const readings = { 'neck-to-hem-front': 485, 'waist-to-hem-front': 140, 'neck-to-hem-back': 999 };
  expect(derivedOf(neckToWaistFront, readings).worked).toBe('485 mm − 140 mm = 345 mm');
});
