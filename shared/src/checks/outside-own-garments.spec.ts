import { expect, it } from 'vitest';
import { sheetOf, testCheck } from '../testing/test-check.js';
import { viewSheet } from './sheet-view.js';
import { outsideOwnGarments } from './outside-own-garments.js';

const waists = [610, 612, 611, 609, 613, 640, 580, 600];
const peers = (...valuesMm: number[]) => ({ peers: [{ pointId: 'waist', valuesMm }] });

// The rule of Iglewicz & Hoaglin (1993), 0.6745 (x − median) ÷ MAD above 3.5; their figures are tested beside it.
testCheck(outsideOwnGarments, {
  quiet: [
    { name: 'nothing to compare with', readings: { waist: 900 } },
    { name: 'seven others', readings: { waist: 900 }, facts: peers(...waists.slice(1)) },
    { name: 'one among the others', readings: { waist: 612 }, facts: peers(...waists) },
    // Median 610.5, MAD 2: 3.5 × 2 ÷ 0.6745 = 10.4 mm to either side.
    { name: 'ten millimetres from their middle', readings: { waist: 620 }, facts: peers(...waists) },
    {
      name: 'others that are all alike: no distance can be told',
      readings: { waist: 900 },
      facts: peers(...Array.from({ length: 12 }, () => 402), 410),
    },
    { name: 'a point that was not read', readings: { bust: 900 }, facts: peers(...waists) },
    {
      name: 'others that are no figures',
      readings: { waist: 900 },
      facts: peers(...waists.slice(1), Number.NaN, Infinity),
    },
  ],
  raises: [
    {
      name: 'eleven millimetres from their middle',
      readings: { waist: '621.5' },
      facts: peers(...waists),
      says: 'Waist comes to 621.5 mm, while the museum’s 8 others of this kind and decade lie close about 610.5 mm. Is it so?',
      severity: 'question',
      points: ['waist'],
    },
  ],
});

it('holds to its answer when the house measures another garment', () => {
  const keyAmong = (...valuesMm: number[]) =>
    outsideOwnGarments.run(viewSheet(sheetOf({ readings: { waist: 700 }, facts: peers(...valuesMm) })))[0]
      ?.key;
  expect(keyAmong(...waists)).toBe('outside-own-garments:far:waist:700');
  expect(keyAmong(...waists, 618)).toBe('outside-own-garments:far:waist:700');
});
