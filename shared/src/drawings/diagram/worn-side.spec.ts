import { describe, expect, it } from 'vitest';
import { measuringPoint, pointsForKind } from '../../points/measuring-points.js';
import { wornSides } from '../../readings/worn-side.js';
import { boundsOf } from '../geometry/path.js';
import { diagramFor, drawnKinds } from '../kinds/diagram-for.js';
import { stretchesOf } from './drawn-line.js';
import type { View } from './model.js';
import { paintDiagram, wornSideOf } from './paint-diagram.js';
import type { ScenePoint } from './scene.js';
import { mirroredLine, wearersRightIn, wornSideAt } from './worn-side.js';

const view = (kind: string, name: string): View => {
  const found = diagramFor(kind)?.views.find((each) => each.name === name);
  if (!found) throw new Error(`no ${name} of a ${kind}`);
  return found;
};

describe('where the wearer’s right lies', () => {
  it('is the viewer’s left in front, and the viewer’s right behind', () => {
    expect(wornSideAt(view('bodice', 'front'), -100)).toBe('right');
    expect(wornSideAt(view('bodice', 'front'), 100)).toBe('left');
    expect(wornSideAt(view('bodice', 'back'), -100)).toBe('left');
    expect(wornSideAt(view('bodice', 'back'), 0)).toBeUndefined();
  });

  it('is the viewer’s left with the lining up, opened in front: one looks at the inside of the back', () => {
    // A woman’s bodice is buttoned right over left: the buttonholes lie in the right front.
    expect(wornSideAt(view('bodice', 'inside'), -374)).toBe('right');
  });

  it('is the viewer’s left from below with the front at the top: the hat’s two brims say so', () => {
    const lines = diagramFor('hat')?.lines ?? [];
    for (const side of wornSides) {
      const brim = lines.find(({ pointId }) => pointId === `brim-${side}`);
      expect(brim && wornSideOf(brim, view('hat', 'below'))).toBe(side);
    }
  });

  it('is said of every view that shows both sides', () => {
    for (const kind of drawnKinds) {
      for (const each of diagramFor(kind)?.views ?? []) {
        expect(['left', 'right', 'neither']).toContain(wearersRightIn(each));
      }
    }
  });
});

const paired = drawnKinds.flatMap((kind) =>
  pointsForKind(kind).flatMap((point) => {
    const line = diagramFor(kind)?.lines.find(({ pointId }) => pointId === point.id);
    return point.paired && line ? [{ kind, pointId: point.id, line, on: view(kind, line.view) }] : [];
  }),
);

describe.each(paired)('$pointId of a $kind', ({ kind, pointId, line, on }) => {
  it('lies on one side, and its twin on the other', () => {
    const side = wornSideOf(line, on);
    if (wearersRightIn(on) === 'neither') return expect(side).toBeUndefined();
    expect(side).toBeDefined();
    const twin = wornSideOf(mirroredLine(line), on);
    expect([side, twin].sort()).toEqual(['left', 'right']);
  });

  it('is the mirror image: the same extent, the other half', () => {
    const extent = (which: typeof line) => boundsOf(stretchesOf(which, on.anchors));
    const [here, there] = [extent(line), extent(mirroredLine(line))];
    expect(there.left).toBeCloseTo(-here.right, 6);
    expect(there.right).toBeCloseTo(-here.left, 6);
    expect(there.top).toBeCloseTo(here.top, 6);
    expect(there.bottom).toBeCloseTo(here.bottom, 6);
  });

  it('is drawn on the side that is being read', () => {
    const middleOf = (wornSide: 'left' | 'right') => {
      const scene = paintDiagram({
        kind,
        views: [on.name],
        widthPx: 400,
        letters: { [pointId]: 'A' },
        current: pointId,
        wornSide,
      });
      const point = scene?.primitives.find((entry): entry is ScenePoint => entry.type === 'point');
      const mark = point?.marks.find(({ role }) => role === 'line-current');
      const xs =
        mark?.type === 'path' ? [...mark.d.matchAll(/(-?[\d.]+) -?[\d.]+/g)].map(([, x]) => Number(x)) : [];
      return (Math.min(...xs) + Math.max(...xs)) / 2 - 200;
    };
    if (wearersRightIn(on) === 'neither') return expect(middleOf('left')).toBe(middleOf('right'));
    const atLeft = wearersRightIn(on) === 'left' ? 'right' : 'left';
    expect(middleOf(atLeft)).toBeLessThan(0);
    expect(middleOf(atLeft === 'left' ? 'right' : 'left')).toBeGreaterThan(0);
  });
});

it('only what is read on both sides has a twin: the waist stays where it is', () => {
  expect(measuringPoint('waist').paired).toBe(false);
  const request = { kind: 'bodice', widthPx: 400, letters: { waist: 'A' }, current: 'waist' } as const;
  expect(paintDiagram({ ...request, wornSide: 'left' })).toEqual(paintDiagram(request));
});
