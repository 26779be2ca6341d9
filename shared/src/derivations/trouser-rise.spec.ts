import { expect, it } from 'vitest';
import { derivedOf } from '../testing/derived-of.js';
import { trouserRise } from './trouser-rise.js';

it('is the outside leg less the inside leg', () => {
  expect(derivedOf(trouserRise, { 'outside-leg': 1080, 'inside-leg': 790 }).worked).toBe(
    '1080 mm − 790 mm = 290 mm',
  );
});
