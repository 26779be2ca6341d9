import { protocolFaults } from '@ellwand/shared/protocols/protocol-rules';
import { protocolFor } from '@ellwand/shared/protocols/standard-protocols';
import { type OwnPointView, toProtocolView } from '@ellwand/shared/records/protocol';
import { describe, expect, it } from 'vitest';
import { trainLoop } from '../../../testing/fake-api/protocols.js';
import {
  bandsOf,
  type Draft,
  moved,
  notAsked,
  protocolOf,
  ready,
  searched,
  withAsking,
  withOwnPoint,
  withoutPoint,
  withPoint,
} from './draft.js';

const skirt: Draft = toProtocolView(protocolFor('skirt'));
const ids = (draft: Draft) => draft.points.map(({ pointId }) => pointId);
const inside = (draft: Draft) => bandsOf(draft)[0]?.rows.map(({ point }) => point.id);

describe('a protocol in the making', () => {
  it('adds a point at the end of its handling step, once', () => {
    const added = withPoint(skirt, 'high-hip');
    expect(inside(added)).toEqual(['waistband', 'hip', 'hem', 'hem-depth', 'high-hip']);
    expect(withPoint(added, 'high-hip')).toBe(added);
    expect(withPoint(skirt, 'no-such-point')).toBe(skirt);
  });

  it('moves within a handling step and not out of it', () => {
    expect(inside(moved(skirt, 'hem', -1))).toEqual(['waistband', 'hem', 'hip', 'hem-depth']);
    expect(ids(moved(skirt, 'hem-depth', 1))).toEqual(ids(skirt));
    expect(ids(moved(skirt, 'waistband', -1))).toEqual(ids(skirt));
  });

  it('offers what is dropped again, and finds it by words of its definition', () => {
    const dropped = withoutPoint(skirt, 'hip');
    expect(notAsked(skirt).map(({ id }) => id)).not.toContain('hip');
    expect(searched(notAsked(dropped), 'HIP').map(({ id }) => id)).toContain('hip');
    expect(searched(notAsked(dropped), 'hip no-such-word')).toEqual([]);
  });

  it('gives letters in handling order', () => {
    const letters = bandsOf(withoutPoint(skirt, 'waistband')).flatMap(({ rows }) =>
      rows.map(({ letter }) => letter),
    );
    expect(letters.join('')).toBe('ABCDEFG');
  });

  it('puts an own point in its step, keeps how it is asked for when it is bettered, and leaves it out when dropped', () => {
    const withLoop = withAsking(withOwnPoint(skirt, trainLoop), trainLoop.id, { required: true, rounds: 2 });
    expect(inside(withLoop)?.at(-1)).toBe(trainLoop.id);
    const advice: OwnPointView = { ...trainLoop, watchFor: 'Note new thread.' };
    const bettered = withOwnPoint(withLoop, advice);
    expect(bettered.points).toEqual(withLoop.points);
    expect(bettered.ownPoints[0]?.watchFor).toBe('Note new thread.');
    const turned = withOwnPoint(withLoop, { ...trainLoop, handlingStep: 'back-up' });
    expect(turned.points.at(-1)).toEqual({ pointId: trainLoop.id, required: true, rounds: 2 });
    expect(protocolFaults(protocolOf(ready(turned)), [])).toEqual([]);
    const dropped = withoutPoint(withLoop, trainLoop.id);
    expect(ready(dropped).ownPoints).toEqual([]);
    expect(notAsked(dropped).map(({ id }) => id)).toContain(trainLoop.id);
  });
});
