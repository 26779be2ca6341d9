import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { diagramFor } from '../kinds/diagram-for.js';
import { measuringLineOf, MOST_PLACES, type OwnLine } from './own-line.js';
import { paintDiagram } from './paint-diagram.js';
import type { ScenePoint } from './scene.js';
import { onGarment, onSheet, viewPlaces } from './sheet-of.js';

const loop: OwnLine = {
  pointId: 'own-band-to-loop',
  view: 'inside',
  way: 'straight',
  along: [
    [60, 20],
    [60, 600],
  ],
};

const paint = (line: OwnLine, widthPx = 400): ScenePoint | undefined =>
  paintDiagram({
    kind: 'skirt',
    widthPx,
    letters: { [line.pointId]: 'A', hem: 'B', hip: 'C' },
    ownLines: [line],
  })?.primitives.find(
    (entry): entry is ScenePoint => entry.type === 'point' && entry.pointId === line.pointId,
  );

const rolesOf = (point: ScenePoint | undefined) => point?.marks.map(({ role }) => role) ?? [];

describe('a line that comes with a museum’s own point', () => {
  it('is painted as the diagram’s own are: halo, line, arrows, letter, and a path for the finger', () => {
    expect(rolesOf(paint(loop))).toEqual(['hit', 'halo', 'line', 'arrow', 'arrow', 'ring', 'letter']);
  });

  it('runs straight through two places and in one curve through more', () => {
    const pathOf = (line: OwnLine) => {
      const mark = paint(line)?.marks.find(({ role }) => role === 'line');
      return mark?.type === 'path' ? mark.d : '';
    };
    const [start = 0, , , end = 1] = [...pathOf(loop).matchAll(/-?\d+(?:\.\d+)?/g)]
      .filter((_, index) => index % 2 === 0)
      .map(Number);
    expect(start).toBeCloseTo(end, 1);
    const bent = pathOf({ ...loop, along: [...loop.along, [200, 900]] });
    expect(bent.match(/M/g)).toHaveLength(1);
    expect(bent.match(/C/g)).toHaveLength(2);
  });

  it('goes round in an arc before and behind, double-ringed, when two places are all that is known', () => {
    const round: OwnLine = {
      ...loop,
      way: 'round',
      along: [
        [-150, 60],
        [150, 60],
      ],
    };
    expect(rolesOf(paint(round))).toContain('behind');
    expect(rolesOf(paint(round))).toContain('inner-ring');
    expect(rolesOf(paint({ ...round, way: 'doubled' }))).not.toContain('behind');
  });

  it('is nothing until there are two different places, and a place tapped twice is one', () => {
    expect(measuringLineOf({ ...loop, along: [] })).toBeUndefined();
    expect(
      measuringLineOf({
        ...loop,
        along: [
          [5, 5],
          [5, 5],
        ],
      }),
    ).toBeUndefined();
    expect(
      measuringLineOf({
        ...loop,
        along: [
          [5, 5],
          [5, 5],
          [9, 5],
        ],
      })?.stretches,
    ).toEqual(['5,5..9,5']);
  });

  it('never stops the painter, wherever the taps fell', () => {
    const place = fc.tuple(
      fc.double({ min: -600, max: 600, noNaN: true }),
      fc.double({ min: -50, max: 1500, noNaN: true }),
    );
    fc.assert(
      fc.property(
        fc.array(place, { maxLength: MOST_PLACES }),
        fc.constantFrom(320, 400, 800),
        (along, widthPx) => {
          const marks = paint({ ...loop, along }, widthPx)?.marks ?? [];
          for (const mark of marks)
            if (mark.type === 'path') expect(mark.d).not.toMatch(/NaN|Infinity|undefined/);
        },
      ),
      { numRuns: 60 },
    );
  });
});

describe('a tap on the drawing', () => {
  it('is turned into the view’s millimetres and back, at any width', () => {
    for (const widthPx of [320, 400, 800]) {
      for (const place of viewPlaces({ kind: 'bodice', widthPx })) {
        const tapped = onSheet(place, [12.5, 40]);
        const [x, y] = onGarment(place, tapped);
        expect(x).toBeCloseTo(12.5, 9);
        expect(y).toBeCloseTo(40, 9);
      }
    }
  });

  it('beside the drawing means its edge', () => {
    const [place] = viewPlaces({ kind: 'skirt', views: ['inside'], widthPx: 400 });
    if (!place) throw new Error('the skirt has no inside view');
    expect(onGarment(place, [-5000, 9000])).toEqual([place.extent.left, place.extent.bottom]);
  });

  it('finds the views in the order asked for, and none of what is not drawn', () => {
    const views = viewPlaces({ kind: 'dress', views: ['back', 'front'], widthPx: 800 });
    expect(views.map(({ view }) => view)).toEqual(['back', 'front']);
    expect(viewPlaces({ kind: 'set', widthPx: 800 })).toEqual([]);
    expect(diagramFor('set')).toBeUndefined();
  });
});
