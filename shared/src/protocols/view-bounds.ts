import type { ViewName } from '../drawings/diagram/model.js';
import { drawView } from '../drawings/diagram/view-shapes.js';
import type { Box } from '../drawings/geometry/point.js';
import { diagramFor } from '../drawings/kinds/diagram-for.js';
import type { GarmentKind } from '../points/kinds.js';

/** The views of a kind's diagram, in their order. */
export function viewsOf(kind: GarmentKind): readonly ViewName[] {
  return diagramFor(kind)?.views.map(({ name }) => name) ?? [];
}

/** The whole millimetres that a view's drawing takes up; undefined where the kind has no such view. */
export function viewBounds(kind: GarmentKind, name: ViewName): Box | undefined {
  const view = diagramFor(kind)?.views.find((each) => each.name === name);
  if (!view) return undefined;
  const { left, right, top, bottom } = drawView(view).bounds;
  return {
    left: Math.floor(left),
    right: Math.ceil(right),
    top: Math.floor(top),
    bottom: Math.ceil(bottom),
  };
}
