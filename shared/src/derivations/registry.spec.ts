import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { kindIds } from '../points/kinds.js';
import { measuringPoint, measuringPoints } from '../points/measuring-points.js';
import { derivationsPage } from '../testing/measuring-pages.js';
import { read } from '../testing/sample-readings.js';
import { add, type Length, mm, times } from '../units/length.js';
import { deriveFromReadings, derivations } from './registry.js';

describe('the registry of derivations', () => {
  it('has each id once, with a label and a formula', () => {
    expect(new Set(derivations.map(({ id }) => id)).size).toBe(derivations.length);
    for (const { label, formula } of derivations) {
      expect(label).toMatch(/^[A-Z]/);
      expect(formula).toMatch(/ [−÷+] |^2 × |^the smallest of /);
    }
  });

  it('needs only points that its kinds have', () => {
    for (const { id, kinds, needs } of derivations) {
      if (typeof needs === 'string') expect(needs, id).toMatch(/^[A-Z].{20,}[^.]$/);
      for (const kind of kinds) {
        for (const need of typeof needs === 'string' ? [] : needs) {
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

  it('gives each value an id of its own, whatever was read and in whatever order', () => {
    const readings = fc.array(
      fc.record({
        pointId: fc.constantFrom(...measuringPoints.map(({ id }) => id)),
        valueMm: fc.integer({ min: 0, max: 4000 }),
        worn: fc.constantFrom('left' as const, 'right' as const, undefined),
      }),
      { maxLength: 30 },
    );
    fc.assert(
      fc.property(fc.constantFrom(...kindIds), readings, readings, (kind, own, others) => {
        const taken = (facts: typeof own) =>
          facts.map(({ pointId, valueMm, worn }, index) =>
            read(pointId, valueMm, { id: `${index}`, round: index + 1, ...(worn ? { worn } : {}) }),
          );
        const otherParts = (['skirt', 'bodice', 'skirt'] as const).map((other) => ({
          kind: other,
          readings: taken(others),
        }));
        const derived = deriveFromReadings(kind, taken(own), { otherParts });
        expect(new Set(derived.map(({ id }) => id)).size).toBe(derived.length);
        const figures = (values: typeof derived) =>
          new Map(values.map(({ id, figure, worked }) => [id, { figure, worked }]));
        const turned = deriveFromReadings(kind, taken(own).reverse(), { otherParts });
        expect(new Set(turned.map(({ id }) => id))).toEqual(new Set(derived.map(({ id }) => id)));
        for (const [id, { figure }] of figures(turned))
          expect(figure).toEqual(figures(derived).get(id)?.figure);
      }),
    );
  });

  it('obeys its identities: what was taken off, put back, is what was read; a half twice is the whole', () => {
    const length = fc.integer({ min: 1, max: 4000 });
    fc.assert(
      fc.property(length, length, length, length, length, (...valuesMm) => {
        const points = [
          'neck-to-hem-back',
          'waist-to-hem-back',
          'waist-to-hem-front',
          'bust',
          'waist',
        ] as const;
        const doubledMm = valuesMm[0] * 2;
        const readings = [
          ...points.map((pointId, index) => read(pointId, valuesMm[index] ?? 1)),
          read('elbow', doubledMm),
        ];
        const derived = new Map(deriveFromReadings('dress', readings).map((value) => [value.id, value]));
        const lengthIn = (id: string): Length => {
          const figure = derived.get(id)?.figure;
          return figure?.type === 'length' ? figure.length : mm(-1);
        };
        const [neck, back, front, bust, waist] = valuesMm;
        expect(add(lengthIn('neck-to-waist-back'), mm(back))).toBe(mm(neck));
        expect(add(lengthIn('back-over-front-excess'), mm(front))).toBe(mm(back));
        expect(add(lengthIn('bust-minus-waist'), mm(waist))).toBe(mm(bust));
        const half = derived.get('whole-from-half:elbow');
        expect(times(half?.trace[0]?.value ?? mm(0), 2)).toBe(lengthIn('whole-from-half:elbow'));
        expect(lengthIn('whole-from-half:elbow')).toBe(mm(doubledMm));
      }),
    );
  });

  it('takes figures of one side of a pair together, and of two sides never', () => {
    const readings = [
      read('sleeve-widest', 600, { worn: 'right' }),
      read('sleeve-widest', 500, { worn: 'left' }),
      read('armscye', 400, { worn: 'left' }),
    ];
    const [left] = deriveFromReadings('bodice', readings).filter(({ id }) => id === 'sleeve-fullness');
    expect(left?.worked).toBe('500 mm ÷ 400 mm = 1.25');
    expect(left?.trace.map(({ label }) => label)).toEqual([
      'Sleeve at its widest, left, as worn',
      'Armscye, left, as worn',
    ]);
    const apart = [read('sleeve-widest', 600, { worn: 'right' }), read('armscye', 400, { worn: 'left' })];
    expect(deriveFromReadings('bodice', apart).map(({ id }) => id)).not.toContain('sleeve-fullness');
  });

  it('has a page that says what the code does', async () => {
    await expect(derivationsPage()).toMatchFileSnapshot('../../../docs/measuring/derivations.md');
  });
});
