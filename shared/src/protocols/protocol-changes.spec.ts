import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { sampleOwnPoint } from '../testing/sample-own-point.js';
import { mm } from '../units/length.js';
import { ownPointIdFor } from './own-point-id.js';
import type { Protocol } from './protocol.js';
import { protocolChanges } from './protocol-changes.js';
import { protocolFor } from './standard-protocols.js';

const bodice = protocolFor('bodice');
const ordered = (ids: readonly string[]): Protocol => ({
  ...bodice,
  points: ids.map((pointId) => ({ pointId, required: true, rounds: 1 })),
});

describe('what a version changed', () => {
  it('names what is asked for, dropped, required, and read again', () => {
    const after: Protocol = {
      ...bodice,
      points: bodice.points
        .filter(({ pointId }) => pointId !== 'armscye')
        .map((point) => {
          if (point.pointId === 'neck') return { ...point, required: true };
          return point.pointId === 'bust' ? { ...point, required: false, rounds: 2 } : point;
        })
        .concat({ pointId: sampleOwnPoint().id, required: true, rounds: 3 }),
      ownPoints: [sampleOwnPoint()],
    };
    expect(protocolChanges(bodice, after)).toEqual([
      'Own point “Band to train loop” asked for, required, 3 rounds.',
      '“Armscye” dropped.',
      '“Bust or chest” may be left out now.',
      '“Bust or chest” read in 2 rounds, not 1.',
      '“Neck” required now.',
    ]);
    expect(protocolChanges(after, bodice)).toContain('“Bust or chest” read in 1 round, not 2.');
  });

  it('names the one that moved, and not those that it passed', () => {
    const before = ordered(['bust', 'waist', 'neck', 'cuff']);
    expect(protocolChanges(before, ordered(['waist', 'neck', 'cuff', 'bust']))).toEqual([
      '“Bust or chest” moved after “Cuff”.',
    ]);
    expect(protocolChanges(before, ordered(['cuff', 'bust', 'waist', 'neck']))).toEqual([
      '“Cuff” moved to the front.',
    ]);
  });

  it('tells what was bettered of an own point', () => {
    const before = { ...bodice, ownPoints: [sampleOwnPoint()] };
    const line = { view: 'inside', along: [[0, 20] as const, [0, 700] as const] } as const;
    const softRange = { from: mm(400), to: mm(1200), basis: 'the house' };
    const after = { ...bodice, ownPoints: [sampleOwnPoint({ line, softRange, watchFor: 'New thread.' })] };
    expect(protocolChanges(before, after)).toEqual([
      'Line of “Band to train loop” drawn anew.',
      'Usual range of “Band to train loop” changed.',
      'What to watch for at “Band to train loop” changed.',
    ]);
  });

  it('is nothing where nothing differs, and something wherever the order does', () => {
    const ids = bodice.points.map(({ pointId }) => pointId);
    const shuffled = fc.shuffledSubarray(ids, { minLength: ids.length, maxLength: ids.length });
    fc.assert(
      fc.property(shuffled, shuffled, (one, other) => {
        const changes = protocolChanges(ordered(one), ordered(other));
        expect(changes.length === 0).toBe(one.join() === other.join());
      }),
    );
  });
});

describe('the id of an own point', () => {
  it('is made from its name, and told apart where that is taken', () => {
    expect(ownPointIdFor('Loop to hem', [])).toBe('own-loop-to-hem');
    expect(ownPointIdFor('Ärmelfutter, 2. Lage', [])).toBe('own-armelfutter-2-lage');
    expect(ownPointIdFor('Loop to hem', ['own-loop-to-hem', 'own-loop-to-hem-2'])).toBe('own-loop-to-hem-3');
  });

  it('is always an id that is taken', () => {
    fc.assert(
      fc.property(fc.string({ maxLength: 90 }), (name) => {
        expect(ownPointIdFor(name, ['own-point'])).toMatch(/^own-[a-z0-9]+(-[a-z0-9]+)*$/);
        expect(ownPointIdFor(name, []).length).toBeLessThanOrEqual(60);
      }),
    );
  });
});
