/** The lines of a museum's own points on its diagram, and where a tap on the drawing lies on the garment. */
import type { ViewName } from '../drawings/diagram/model.js';
import type { OwnLine } from '../drawings/diagram/own-line.js';
import { paintDiagram, type DiagramRequest } from '../drawings/diagram/paint-diagram.js';
import { type Projection, unprojected } from '../drawings/diagram/projection.js';
import type { Scene } from '../drawings/diagram/scene.js';
import { viewPlaces } from '../drawings/diagram/sheet-of.js';

export interface ProtocolScene {
  readonly scene: Scene;
  /** Where each view stands on the sheet. */
  readonly projections: ReadonlyMap<ViewName, Projection>;
}

/** The kind's diagram with a protocol's own lines on it; undefined where the kind is not drawn. */
export function paintProtocol(
  request: DiagramRequest,
  ownLines: readonly OwnLine[],
): ProtocolScene | undefined {
  const scene = paintDiagram({ ...request, ownLines });
  if (!scene) return undefined;
  const projections = new Map(
    viewPlaces(request).map(({ view, projection }): [ViewName, Projection] => [view, projection]),
  );
  return { scene, projections };
}

/** The garment's whole millimetres beneath a place of the sheet. */
export function placeUnder(
  pixels: readonly [number, number],
  projection: Projection,
): readonly [number, number] {
  const [x, y] = unprojected(projection)(pixels);
  return [Math.round(x), Math.round(y)];
}
