import { describe, expect, it } from 'vitest';
import { type GarmentKind, kindIds } from '../points/kinds.js';
import { findMeasuringPoint } from '../points/measuring-points.js';
import { handlingSteps } from '../points/point.js';
import { lettersFor, LONGEST_PROTOCOL, pointsOf, protocolPointIds } from './protocol.js';
import { protocolFor, wornTogetherProtocol } from './standard-protocols.js';

const asksFor = (kind: GarmentKind): readonly string[] => protocolPointIds(protocolFor(kind));

describe.each(kindIds)('the protocol of a %s', (kind) => {
  const protocol = protocolFor(kind);
  const points = pointsOf(protocol);

  it('goes opened, front up, back up, and never back again', () => {
    const steps = points.map(({ handlingStep }) => handlingSteps.indexOf(handlingStep));
    expect(steps).toEqual([...steps].sort((first, second) => first - second));
  });

  it('asks only for points that apply to the kind, each once, and requires at least one', () => {
    for (const point of points) expect(point.kinds, point.id).toContain(kind);
    expect(new Set(points).size).toBe(points.length);
    expect(protocol.points.some(({ required }) => required)).toBe(true);
  });

  it('gives every point a letter of its own', () => {
    const letters = [...lettersFor(protocol).values()];
    expect(letters[0]).toBe('A');
    expect(new Set(letters).size).toBe(points.length);
    expect(letters.length).toBeLessThanOrEqual(LONGEST_PROTOCOL);
    expect(letters.join('')).not.toMatch(/[IO]/);
  });

  it('does not ask for what can be worked out', () => {
    for (const side of ['front', 'back'] as const) {
      const asked = asksFor(kind);
      if (asked.includes(`neck-to-hem-${side}`) && asked.includes(`waist-to-hem-${side}`)) {
        expect(asked).not.toContain(`neck-to-waist-${side}`);
      }
    }
  });
});

describe('protocols together', () => {
  it('ask a dress in two parts for fewer than thirty readings', () => {
    expect(asksFor('bodice').length + asksFor('skirt').length).toBeLessThan(30);
  });

  it('ask for a dress laid together as worn only what no part has', () => {
    for (const id of protocolPointIds(wornTogetherProtocol)) {
      expect(findMeasuringPoint(id)?.wornTogether).toBe(true);
      for (const kind of kindIds) expect(asksFor(kind)).not.toContain(id);
    }
  });

  it('go on past Z without giving a letter twice', () => {
    const long = {
      ...protocolFor('dress'),
      points: [...protocolFor('dress').points, ...protocolFor('hat').points],
    };
    const letters = [...lettersFor(long).values()];
    expect(letters[LONGEST_PROTOCOL]).toBe('A2');
    expect(new Set(letters).size).toBe(long.points.length);
  });
});
