import { describe, expect, it } from 'vitest';
import { kindIds, type GarmentKind } from '../../points/kinds.js';
import { pointsForKind } from '../../points/measuring-points.js';
import { pointOn } from '../geometry/cubic.js';
import { distanceToPolyline, distanceToSegment, type Point } from '../geometry/point.js';
import { diagramFor, drawnKinds } from '../kinds/diagram-for.js';
import { viewOfPoint } from './model.js';
import { paintDiagram, type DiagramRequest } from './paint-diagram.js';
import type { Scene, SceneCircle, ScenePath, ScenePoint } from './scene.js';

const letters = new Map(
  drawnKinds.flatMap((kind) =>
    diagramFor(kind)!.lines.map((line, index) => [line.pointId, twoSigns(index)] as const),
  ),
);

function twoSigns(index: number): string {
  return index < 24 ? 'ABCDEFGHJKLMNPQRSTUVWXYZ'.charAt(index) : `A${index}`;
}

function paint(kind: GarmentKind, request: Partial<DiagramRequest> = {}): Scene {
  const scene = paintDiagram({ kind, widthPx: 800, letters, ...request });
  if (!scene) throw new Error(`no diagram for ${kind}`);
  return scene;
}

const pointsOf = (scene: Scene): ScenePoint[] => scene.primitives.filter((entry) => entry.type === 'point');

const ringOf = (point: ScenePoint): SceneCircle | undefined =>
  point.marks.find((mark): mark is SceneCircle => mark.type === 'circle' && mark.role.startsWith('ring'));

const pathsOf = (point: ScenePoint, ...roles: string[]): ScenePath[] =>
  point.marks.filter((mark): mark is ScenePath => mark.type === 'path' && roles.includes(mark.role));

/** Reads painted path data back into points, so that the gaps are those of the picture itself. */
function tracesOf(d: string): Point[][] {
  return d
    .split('M')
    .slice(1)
    .map((subpath) => {
      const numbers = [...subpath.matchAll(/-?\d+(?:\.\d+)?/g)].map(([digits]) => Number(digits));
      const at = (index: number): Point => [numbers[2 * index]!, numbers[2 * index + 1]!];
      const points: Point[] = [at(0)];
      if (subpath.includes('L')) return [at(0), at(1)];
      for (let index = 0; index + 3 < numbers.length / 2; index += 3) {
        const cubic = [at(index), at(index + 1), at(index + 2), at(index + 3)] as const;
        for (let step = 1; step <= 40; step++) points.push(pointOn(cubic, step / 40));
      }
      return points;
    });
}

const outerRadius = (ring: SceneCircle): number => ring.r + ring.strokeWidth / 2;

const sheets = drawnKinds.flatMap((kind) => {
  const { lines, views: all } = diagramFor(kind)!;
  // A view without measuring lines, such as the back of breeches, is there to be looked at.
  const views = all.map(({ name }) => name).filter((name) => lines.some(({ view }) => view === name));
  return [360, 400, 560, 800].flatMap((widthPx) =>
    [views, ...views.map((view) => [view])].map((chosen) => ({ kind, widthPx, views: chosen })),
  );
});

describe.each(sheets)('$kind at $widthPx px, $views', ({ kind, widthPx, views }) => {
  const scene = paint(kind, { widthPx, views });
  const points = pointsOf(scene);

  it('gives every line a letter within the sheet', () => {
    expect(points.length).toBeGreaterThan(0);
    for (const point of points) {
      const ring = ringOf(point);
      expect(ring, point.pointId).toBeDefined();
      const reach = outerRadius(ring!);
      expect(Math.min(ring!.cx, scene.width - ring!.cx, ring!.cy, scene.height - ring!.cy)).toBeGreaterThan(
        reach,
      );
    }
  });

  it('keeps letters 3 px from each other, and leaders off them', () => {
    for (const [index, one] of points.entries()) {
      for (const other of points.slice(index + 1)) {
        const [a, b] = [ringOf(one)!, ringOf(other)!];
        const gap = Math.hypot(a.cx - b.cx, a.cy - b.cy) - outerRadius(a) - outerRadius(b);
        expect(gap, `${one.pointId} and ${other.pointId}`).toBeGreaterThanOrEqual(3 - 0.05);
      }
      for (const leader of pathsOf(one, 'leader')) {
        const [from, to] = tracesOf(leader.d)[0]! as [Point, Point];
        for (const other of points.filter((entry) => entry !== one)) {
          const ring = ringOf(other)!;
          expect(distanceToSegment([ring.cx, ring.cy], from, to)).toBeGreaterThan(outerRadius(ring));
        }
      }
    }
  });

  it('keeps letters 2.5 px from every other measuring line', () => {
    for (const point of points) {
      const ring = ringOf(point)!;
      for (const other of points.filter((entry) => entry !== point)) {
        const traces = pathsOf(other, 'line', 'behind', 'step').flatMap(({ d }) => tracesOf(d));
        const nearest = Math.min(...traces.map((trace) => distanceToPolyline([ring.cx, ring.cy], trace)));
        expect(
          nearest - outerRadius(ring),
          `${point.pointId} beside ${other.pointId}`,
        ).toBeGreaterThanOrEqual(2.45);
      }
    }
  });
});

describe.each(drawnKinds)('the diagram of a %s', (kind) => {
  const diagram = diagramFor(kind)!;

  it('has a line for every point of the kind, and each on one view', () => {
    const drawn = diagram.lines.map((line) => line.pointId);
    expect(new Set(drawn).size).toBe(drawn.length);
    for (const point of pointsForKind(kind)) {
      expect(drawn, point.id).toContain(point.id);
    }
    for (const line of diagram.lines) expect(diagram.views.map((view) => view.name)).toContain(line.view);
  });

  it('double-rings what goes all round, and breaks the line of what is doubled', () => {
    for (const point of pointsOf(paint(kind))) {
      const { way } = diagram.lines.find((line) => line.pointId === point.pointId)!;
      expect(
        point.marks.some((mark) => mark.role === 'inner-ring'),
        point.pointId,
      ).toBe(way === 'round');
      expect(
        pathsOf(point, 'line').some((path) => path.dash !== undefined),
        point.pointId,
      ).toBe(way === 'doubled');
    }
  });

  it('shows what is taken inside on the inside view, where there is one', () => {
    if (!diagram.views.some((view) => view.name === 'inside')) return;
    for (const id of ['bust', 'waist', 'inner-waist-band', 'neck', 'waistband', 'hip', 'hem'] as const) {
      expect(viewOfPoint(diagram, id) ?? 'inside', id).toBe('inside');
    }
  });

  it('cuts seams off at the outlines, and every clip named is there', () => {
    const scene = paint(kind);
    const named = scene.primitives.flatMap((entry) =>
      entry.type === 'path' && entry.clip ? [entry.clip] : [],
    );
    expect(named.length).toBeGreaterThan(0);
    const ids = scene.clips.map((clip) => clip.id);
    expect(new Set(ids).size).toBe(ids.length);
    for (const clip of named) expect(ids).toContain(clip);
  });

  it('is painted the same each time', () => {
    expect(paint(kind, { widthPx: 560 })).toEqual(paint(kind, { widthPx: 560 }));
  });

  it('keeps its strokes true at any size', () => {
    for (const widthPx of [360, 1200]) {
      const strokes = paint(kind, { widthPx }).primitives.flatMap((entry) =>
        entry.type === 'path' ? [[entry.role, entry.strokeWidth] as const] : [],
      );
      expect(strokes.filter(([role]) => role === 'cloth').every(([, width]) => width === 2.2)).toBe(true);
      expect(strokes.filter(([role]) => role === 'seam').every(([, width]) => width === 1.4)).toBe(true);
    }
  });

  it('gives the finger a path 24 px wide along every line', () => {
    for (const point of pointsOf(paint(kind))) {
      expect(pathsOf(point, 'hit').map((hit) => [hit.strokeWidth, hit.pointId])).toEqual([
        [24, point.pointId],
      ]);
    }
  });
});

describe('what is asked of a diagram', () => {
  it('draws only the points and views asked for, and lights the current one', () => {
    const scene = paint('bodice', { views: ['front'], points: ['elbow', 'bust'], current: 'elbow' });
    expect(pointsOf(scene).map((point) => [point.pointId, point.current])).toEqual([['elbow', true]]);
    expect(pathsOf(pointsOf(scene)[0]!, 'line-current')).toHaveLength(1);
    expect(scene.title).toBe('Bodice: front');
  });

  it('leaves out lines without a letter, and takes letters as a record too', () => {
    const scene = paint('skirt', { letters: { hip: 'C', hem: 'B' } });
    expect(pointsOf(scene).map((point) => `${point.letter} ${point.pointId}`)).toEqual(['C hip', 'B hem']);
  });

  it('puts the prefix before every clip, so that two diagrams can share a page', () => {
    const { clips } = paint('skirt', { idPrefix: 'second' });
    expect(clips.every((clip) => clip.id.startsWith('second-'))).toBe(true);
  });

  it('there is one for every kind that is measured, and none for a set', () => {
    expect([...drawnKinds].sort()).toEqual([...kindIds].sort());
    expect(paintDiagram({ kind: 'set', widthPx: 400, letters })).toBeUndefined();
  });
});
