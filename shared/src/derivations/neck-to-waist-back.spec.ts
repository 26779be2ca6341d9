import { expect, it } from 'vitest';
import { derivedOf, derivedWithUncertainty } from '../testing/derived-of.js';
import { mm } from '../units/length.js';
import { neckToWaistBack } from './neck-to-waist-back.js';

// A difference carries u = √(u₁² + u₂²): 1400 − 1020 = 380, each known to 2 mm, is known to 2.83 mm.
it('1400 − 1020 is 380 mm, known to 2.83 mm where each was known to 2', () => {
  const figure = derivedWithUncertainty(neckToWaistBack, [
    ['neck-to-hem-back', 1400, 2],
    ['waist-to-hem-back', 1020, 2],
  ]);
  expect(figure).toMatchObject({ type: 'length', length: mm(380) });
  expect(figure?.type === 'length' && figure.uncertaintyMm).toBeCloseTo(2.83, 2);
});

it('shows the figures that were put in', () => {
  const derived = derivedOf(neckToWaistBack, { 'neck-to-hem-back': 1400, 'waist-to-hem-back': 1020 });
  expect(derived.worked).toBe('1400 mm − 1020 mm = 380 mm');
  expect(derived.trace.map(({ label }) => label)).toEqual(['Neck to hem, back', 'Waist to hem, back']);
});

it('has no value while one of its readings is missing', () => {
  expect(() => derivedOf(neckToWaistBack, { 'neck-to-hem-back': 1400 })).toThrow('has no value');
});
