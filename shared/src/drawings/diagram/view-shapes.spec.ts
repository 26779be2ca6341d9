import { describe, expect, it } from 'vitest';
import { sampled } from '../geometry/path.js';
import { diagramFor, drawnKinds } from '../kinds/diagram-for.js';
import { cloth, seam } from './layers.js';
import type { View } from './model.js';
import { drawView } from './view-shapes.js';

const square: View = {
  name: 'front',
  caption: 'Front',
  anchors: {},
  layers: [cloth('0,0!--50,0!--50,80!--0,80!'), seam('20,-10--20,90'), seam('0,0--0,80', 'once', 'all')],
};

describe('a view', () => {
  it('closes halves, mirrors what stands on both sides, and leaves single lines single', () => {
    const { shapes, bounds } = drawView(square);
    expect(shapes.map((shape) => (shape.kind === 'shape' ? shape.role : 'button'))).toEqual([
      'cloth',
      'seam',
      'seam',
      'seam',
    ]);
    expect(bounds).toEqual({ left: -50, top: 0, right: 50, bottom: 80 });
  });

  it('cuts an overshooting seam off at the cloth, and what may be seen everywhere not', () => {
    const clips = drawView(square).shapes.map((shape) => (shape.kind === 'shape' ? shape.clip : undefined));
    expect(clips).toEqual([undefined, { from: 0, to: 1 }, { from: 0, to: 1 }, undefined]);
  });
});

const halves = drawnKinds.flatMap((kind) =>
  diagramFor(kind)!.views.flatMap((view) =>
    view.layers.some((layer) => layer.role !== 'button' && layer.symmetry === 'joined')
      ? [{ kind, view }]
      : [],
  ),
);

it.each(halves)('the $kind, $view.name, has symmetrical outlines', ({ view }) => {
  const joined = view.layers.filter((layer) => layer.role !== 'button' && layer.symmetry === 'joined');
  for (const layer of joined) {
    const [outline] = drawView({ ...view, layers: [layer] }).silhouettes;
    const points = sampled(outline!, 15);
    for (const [x, y] of points)
      expect(points.some(([otherX, otherY]) => Math.hypot(otherX + x, otherY - y) < 1e-6)).toBe(true);
  }
});
