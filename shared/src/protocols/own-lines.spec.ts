import { describe, expect, it } from 'vitest';
import { paintDiagram } from '../drawings/diagram/paint-diagram.js';
import type { Scene, ScenePoint } from '../drawings/diagram/scene.js';
import { sampleOwnPoint } from '../testing/sample-own-point.js';
import { extraLinesOf } from './extra-lines.js';
import { paintProtocol, placeUnder } from './own-lines.js';
import { lettersFor, type Protocol } from './protocol.js';
import { protocolFor } from './standard-protocols.js';
import { viewBounds, viewsOf } from './view-bounds.js';

const loop = sampleOwnPoint();
const skirt = protocolFor('skirt');
const protocol: Protocol = {
  ...skirt,
  points: [{ pointId: loop.id, required: true, rounds: 1 }, ...skirt.points],
  ownPoints: [loop],
};
const request = { kind: 'skirt', widthPx: 560, letters: lettersFor(protocol) } as const;
const paint = (own = [loop], more = {}) => paintProtocol({ ...request, ...more }, extraLinesOf(own));
const pointsOf = (scene: Scene | undefined): ScenePoint[] =>
  (scene?.primitives ?? []).filter((entry) => entry.type === 'point');
const ringsOf = (point: ScenePoint) =>
  point.marks.flatMap((mark) => (mark.type === 'circle' && mark.role.startsWith('ring') ? [mark] : []));

describe('a museum’s own line on the diagram', () => {
  it('is drawn with its letter beside all that the diagram has', () => {
    const scene = paint()?.scene;
    const own = pointsOf(scene).find(({ pointId }) => pointId === loop.id);
    expect(own).toMatchObject({ letter: 'A', view: 'inside', current: false });
    expect(pointsOf(scene)).toHaveLength(pointsOf(paintDiagram(request)).length + 1);
  });

  it('runs from its first place to its last, in the view’s own millimetres', () => {
    const painted = paint();
    const projection = painted?.projections.get('inside');
    const own = pointsOf(painted?.scene).find(({ pointId }) => pointId === loop.id);
    const line = own?.marks.find((mark) => mark.type === 'path' && mark.role === 'line');
    const figures = line?.type === 'path' ? [...line.d.matchAll(/-?\d+(?:\.\d+)?/g)].map(Number) : [];
    const ends = [figures.slice(0, 2), figures.slice(-2)];
    expect(projection && ends.map(([x = 0, y = 0]) => placeUnder([x, y], projection))).toEqual([
      [0, 20],
      [0, 600],
    ]);
  });

  it('breaks where it is doubled, and double-rings where it goes round, as every line does', () => {
    const doubled = pointsOf(paint([{ ...loop, how: 'flat-doubled' }])?.scene).at(-1);
    expect(doubled?.marks.some((mark) => mark.type === 'path' && mark.dash !== undefined)).toBe(true);
    const round = pointsOf(paint([{ ...loop, how: 'round' }])?.scene).at(-1);
    expect(round?.marks.some(({ role }) => role === 'inner-ring')).toBe(true);
  });

  it('leaves the other letters readable', () => {
    for (const widthPx of [368, 560, 800]) {
      const points = pointsOf(paint([loop], { widthPx })?.scene);
      const own = points.filter(({ pointId }) => pointId === loop.id).flatMap(ringsOf);
      const others = points.filter(({ pointId }) => pointId !== loop.id).flatMap(ringsOf);
      for (const ring of own) {
        for (const other of others) {
          const gap = Math.hypot(ring.cx - other.cx, ring.cy - other.cy) - ring.r - other.r;
          expect(gap).toBeGreaterThan(0);
        }
      }
    }
  });

  it('stays away from a view that is not shown, and from a sheet that does not ask for it', () => {
    expect(pointsOf(paint([loop], { views: ['front'] })?.scene).map(({ pointId }) => pointId)).not.toContain(
      loop.id,
    );
    expect(pointsOf(paint([loop], { points: ['hem'] })?.scene).map(({ pointId }) => pointId)).toEqual([
      'hem',
    ]);
    expect(
      pointsOf(paint([sampleOwnPoint({ line: { view: 'inside', along: [[0, 0]] } })])?.scene),
    ).toHaveLength(8);
  });

  it('lies within the drawing, whose bounds every view of every kind tells', () => {
    expect(viewsOf('skirt')).toContain('inside');
    const bounds = viewBounds('skirt', 'inside');
    for (const [x, y] of loop.line.along) {
      expect(x >= (bounds?.left ?? 1) && x <= (bounds?.right ?? 0)).toBe(true);
      expect(y >= (bounds?.top ?? 1) && y <= (bounds?.bottom ?? 0)).toBe(true);
    }
    expect(viewBounds('skirt', 'below')).toBeUndefined();
  });
});
