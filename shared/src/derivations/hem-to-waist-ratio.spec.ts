import { expect, it } from 'vitest';
import { derivedOf, derivedWithUncertainty } from '../testing/derived-of.js';
import { mm, times } from '../units/length.js';
import { hemToWaistRatio } from './hem-to-waist-ratio.js';

// The same skirt of about 1865: hem 133 in, waist 28 in.
it('a hem of 133 in on a waist of 28 in is 4.75 waists', () => {
  expect(times(mm('25.4'), 133)).toBe(mm('3378.2'));
  expect(times(mm('25.4'), 28)).toBe(mm('711.2'));
  const derived = derivedOf(hemToWaistRatio, { hem: '3378.2', waistband: '711.2' });
  expect(derived.figure).toMatchObject({ type: 'ratio', ratio: 4.75, text: '4.75' });
  expect(derived.worked).toBe('3378.2 mm ÷ 711.2 mm = 4.75');
});

it('takes the waistband where there is one, else the waist', () => {
  expect(derivedOf(hemToWaistRatio, { hem: 3000, waist: 600 }).figure).toMatchObject({ text: '5.00' });
  expect(derivedOf(hemToWaistRatio, { hem: 3000, waist: 600, waistband: 750 }).figure).toMatchObject({
    text: '4.00',
  });
});

it('carries the uncertainty of both', () => {
  const figure = derivedWithUncertainty(hemToWaistRatio, [
    ['hem', 3000, 6],
    ['waistband', 600, 2],
  ]);
  // √((6 ÷ 600)² + (5 × 2 ÷ 600)²)
  expect(figure?.type === 'ratio' && figure.uncertainty).toBeCloseTo(Math.hypot(0.01, 1 / 60), 10);
});

it('has no value for a waist of nothing', () => {
  expect(
    derivedWithUncertainty(hemToWaistRatio, [
      ['hem', 3000, 2],
      ['waist', 0, 2],
    ]),
  ).toBeUndefined();
});
