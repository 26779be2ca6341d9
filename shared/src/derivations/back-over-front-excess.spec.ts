import { expect, it } from 'vitest';
import { derivedOf } from '../testing/derived-of.js';
import { mm, times } from '../units/length.js';
import { backOverFrontExcess } from './back-over-front-excess.js';

// A skirt of about 1865, converted from a record in inches: 44 in front, 46 in back.
it('a skirt of 44 in front and 46 in back is 50.8 mm longer behind', () => {
  expect(times(mm('25.4'), 44)).toBe(mm('1117.6'));
  expect(times(mm('25.4'), 46)).toBe(mm('1168.4'));
  const readings = { 'waist-to-hem-front': '1117.6', 'waist-to-hem-back': '1168.4' };
  expect(derivedOf(backOverFrontExcess, readings).figure).toMatchObject({ length: mm('50.8') });
});

it('is negative where the front is the longer', () => {
  const readings = { 'waist-to-hem-front': 1010, 'waist-to-hem-back': 1000 };
  expect(derivedOf(backOverFrontExcess, readings).worked).toBe('1000 mm − 1010 mm = −10 mm');
});
