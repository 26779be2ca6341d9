import { expect, it } from 'vitest';
import { derivedOf } from '../testing/derived-of.js';
import { sleeveFullness } from './sleeve-fullness.js';

it('is the widest of the sleeve in armscyes', () => {
  const derived = derivedOf(sleeveFullness, { 'sleeve-widest': 1260, armscye: 420 });
  expect(derived.worked).toBe('1260 mm ÷ 420 mm = 3.00');
});

it('is about one for a close sleeve', () => {
  expect(derivedOf(sleeveFullness, { 'sleeve-widest': 420, armscye: 425 }).figure).toMatchObject({
    text: '0.99',
  });
});
