import { describe, expect, it } from 'vitest';
import { kindIds } from '../points/kinds.js';
import { mm } from '../units/length.js';
import { sampleOwnPoint } from '../testing/sample-own-point.js';
import { askablePoints, type OwnPoint, type Protocol, type ProtocolPoint } from './protocol.js';
import { protocolAdvice } from './protocol-advice.js';
import { MOST_POINTS, protocolFaults } from './protocol-rules.js';
import { protocolFor, wornTogetherProtocol } from './standard-protocols.js';

const must = (pointId: string): ProtocolPoint => ({ pointId, required: true, rounds: 1 });
const skirt = protocolFor('skirt');
const loop = sampleOwnPoint();

function skirtOf(...pointIds: string[]): Protocol {
  return { ...skirt, version: 2, points: pointIds.map(must) };
}
function withOwn(ownPoints: readonly OwnPoint[], ...pointIds: string[]): Protocol {
  return { ...skirtOf(...pointIds), ownPoints };
}
const places = (draft: Protocol, made: readonly Protocol[] = []) =>
  protocolFaults(draft, made).map(({ pointer, detail }) => `${pointer} ${detail}`);

describe('a new version of a protocol', () => {
  it.each([...kindIds.map(protocolFor), wornTogetherProtocol])(
    'may be as the house’s own of $kind, together $wornTogether',
    (protocol) => {
      expect(places(protocol)).toEqual([]);
      expect(protocolAdvice(protocol)).toEqual([]);
    },
  );

  it('asks for something, and requires one point at least', () => {
    expect(places(skirtOf())).toEqual(['/points Require at least one point: there is no point at all.']);
    const lax = { ...skirt, points: skirt.points.map((point) => ({ ...point, required: false })) };
    expect(places(lax)).toEqual(['/points Require at least one point: every one may be left out.']);
  });

  it('asks for forty points at most', () => {
    const own = Array.from({ length: MOST_POINTS + 1 }, (_, at) =>
      sampleOwnPoint({ id: `own-loop-${at}`, name: `Loop ${at}` }),
    );
    const ids = own.map(({ id }) => id);
    expect(places(withOwn(own.slice(0, MOST_POINTS), ...ids.slice(0, MOST_POINTS)))).toEqual([]);
    expect(places(withOwn(own, ...ids))).toEqual(['/points At most 40 points: there are 41.']);
  });

  it('asks for each point once, of those that its kind has', () => {
    expect(places(skirtOf('hem', 'waistband', 'hem'))).toEqual([
      '/points/2/pointId “Hem” is asked for twice, at 1 and at 3.',
    ]);
    expect(places(skirtOf('waistband', 'armscye', 'no-such-point'))).toEqual([
      '/points/1/pointId “Armscye” is not a point of a skirt.',
      '/points/2/pointId Expected a measuring point of a skirt or one made here, got “no-such-point”.',
    ]);
    expect(places({ ...wornTogetherProtocol, points: [must('bust')] })).toEqual([
      '/points/0/pointId “Bust or chest” is not a point of a dress laid together as worn.',
    ]);
  });

  // The garment is turned over once: opened and inside, front up, back up (trade rule, common practice).
  it('never has the garment turned back', () => {
    expect(places(skirtOf('waist-to-hem-back', 'waistband', 'waist-to-hem-front'))).toEqual([
      '/points/1/pointId “Waistband” (opened, inside) stands after “Waist to hem, back” (back up): ' +
        'the garment would be turned back. Put it before.',
      '/points/2/pointId “Waist to hem, front” (front up) stands after “Waist to hem, back” (back up): ' +
        'the garment would be turned back. Put it before.',
    ]);
    expect(places(withOwn([loop], 'waist-to-hem-front', loop.id))).toEqual([
      expect.stringContaining('“Band to train loop” (opened, inside) stands after “Waist to hem, front”'),
    ]);
  });

  it('warns of what can be worked out, where all that it needs is asked for', () => {
    const bodice = protocolFor('bodice');
    const more = { ...bodice, points: [...bodice.points, must('neck-to-waist-front')] };
    expect(protocolAdvice(more)).toEqual([
      '“Neck to waist, front” can be worked out from “Neck to hem, front” and “Waist to hem, front”: ' +
        'it need not be measured.',
    ]);
    const without = more.points.filter(({ pointId }) => pointId !== 'waist-to-hem-front');
    expect(protocolAdvice({ ...more, points: without })).toEqual([]);
  });

  it('offers every point that its kind has, those of parts together apart', () => {
    expect(askablePoints(skirt).map(({ id }) => id)).toContain('waistband');
    expect(askablePoints(protocolFor('dress')).some(({ wornTogether }) => wornTogether)).toBe(false);
    expect(askablePoints(wornTogetherProtocol).every(({ wornTogether }) => wornTogether)).toBe(true);
  });
});

describe('a point of the museum’s own', () => {
  it('is asked for, by an id and a name that nothing else has', () => {
    expect(places(withOwn([loop], 'hem', loop.id))).toEqual([]);
    expect(places(withOwn([loop], 'hem'))).toEqual([
      '/ownPoints/0/id “Band to train loop” is made here, but asked for nowhere.',
    ]);
    const shadow = sampleOwnPoint({ id: 'hem', name: 'hem' });
    expect(places(withOwn([shadow], 'hem'))).toEqual([
      '/ownPoints/0/id “hem” is a point of the catalogue: an own point needs an id of its own.',
      '/ownPoints/0/name The catalogue has a point called “hem”: give yours another name.',
    ]);
    expect(places(withOwn([loop, loop], loop.id))).toEqual([
      '/ownPoints/1/id Two own points have the id “own-band-to-loop”.',
      '/ownPoints/1/name Two own points are called “Band to train loop”.',
    ]);
  });

  it('has its line on the drawing, on a view that there is', () => {
    const off = sampleOwnPoint({
      line: {
        view: 'inside',
        along: [
          [0, 20],
          [0, 9000],
        ],
      },
    });
    expect(places(withOwn([off], loop.id))).toEqual([
      expect.stringMatching(
        /^\/ownPoints\/0\/line\/along\/1 Place 2 lies off the drawing, at 0, 9000 mm: across/,
      ),
    ]);
    const below = sampleOwnPoint({ line: { ...loop.line, view: 'below' } });
    expect(places(withOwn([below], loop.id))).toEqual([
      expect.stringMatching(/^\/ownPoints\/0\/line\/view The diagram has no view “below”; it has /),
    ]);
    const [first = [0, 0]] = loop.line.along;
    const still = sampleOwnPoint({ line: { view: 'inside', along: [first, first] } });
    expect(places(withOwn([still], loop.id))).toEqual([
      '/ownPoints/0/line/along/1 Places 1 and 2 are the same.',
    ]);
  });

  it('has a usual range that ends after it begins', () => {
    const backward = sampleOwnPoint({ softRange: { from: mm(900), to: mm(500), basis: 'the house' } });
    expect(places(withOwn([backward], loop.id))).toEqual([
      '/ownPoints/0/range The usual range ends where it begins, or before.',
    ]);
  });

  it('keeps its meaning in every later version, of other kinds too; line, range and advice may be bettered', () => {
    const made = [withOwn([loop], loop.id)];
    const bettered = sampleOwnPoint({
      watchFor: 'Mind the loop.',
      softRange: { from: mm(400), to: mm(1200), basis: 'the house' },
    });
    expect(places({ ...withOwn([bettered], loop.id), version: 3 }, made)).toEqual([]);
    const changed = sampleOwnPoint({ how: 'curve', definition: 'Something else.' });
    expect(places({ ...withOwn([changed], loop.id), version: 3 }, made)).toEqual([
      '/ownPoints/0/id “Band to train loop” was made in version 2 of the protocol for skirts and keeps its meaning. ' +
        'Different here: definition, how the tape goes. Make a new point instead.',
    ]);
  });
});
