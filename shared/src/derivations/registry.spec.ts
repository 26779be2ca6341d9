import { describe, expect, it } from 'vitest';
import { measuringPoint } from '../points/measuring-points.js';
import { derivationsPage } from '../testing/measuring-pages.js';
import { read } from '../testing/sample-readings.js';
import { deriveFromReadings, derivations } from './registry.js';

describe('the registry of derivations', () => {
  it('has each id once, with a label and a formula', () => {
    expect(new Set(derivations.map(({ id }) => id)).size).toBe(derivations.length);
    for (const { label, formula } of derivations) {
      expect(label).toMatch(/^[A-Z]/);
      expect(formula).toMatch(/ [−÷] /);
    }
  });

  it('needs only points that its kinds have', () => {
    for (const { id, kinds, needs } of derivations) {
      for (const kind of kinds) {
        for (const need of needs) {
          const has = need.some((pointId) => measuringPoint(pointId).kinds.includes(kind));
          expect(has, `${id} on ${kind}`).toBe(true);
        }
      }
    }
  });

  it('derives for a kind what its readings allow, and nothing that is not meant for it', () => {
    const readings = [
      read('neck-to-hem-back', 1400),
      read('waist-to-hem-back', 1020),
      read('waist-to-hem-front', 1000),
      read('hem', 3000),
    ];
    const ids = (kind: 'dress' | 'bodice'): string[] =>
      deriveFromReadings(kind, readings).map(({ id }) => id);
    expect(ids('dress')).toEqual(['neck-to-waist-back', 'back-over-front-excess']);
    expect(ids('bodice')).toEqual(['neck-to-waist-back']);
  });

  it('has a page that says what the code does', async () => {
    await expect(derivationsPage()).toMatchFileSnapshot('../../../docs/measuring/derivations.md');
  });
});
