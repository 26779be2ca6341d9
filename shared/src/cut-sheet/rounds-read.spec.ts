import { expect, it } from 'vitest';
import { read } from '../testing/sample-readings.js';
import { mm } from '../units/length.js';
import { roundsRead } from './rounds-read.js';

it('takes one round a level, the waist before the band, as the mean of its rounds', () => {
  const rounds = roundsRead([
    read('hem', 2742),
    read('waistband', 620),
    read('waist', 611),
    read('waist', 613, { round: 2 }),
    read('bust', 862),
    read('sleeve-outer', 584),
  ]);
  expect(rounds).toEqual([
    { level: 'bust', label: 'Bust or chest', value: mm(862) },
    { level: 'waist', label: 'Waist', value: mm(612) },
    { level: 'hem', label: 'Hem', value: mm(2742) },
  ]);
});

it('is nothing where nothing was read', () => {
  expect(roundsRead([])).toEqual([]);
});
