import type { Box, Point } from '../geometry/point.js';
import { diagramFor } from '../kinds/diagram-for.js';
import type { GarmentDiagram, ViewName } from './model.js';
import type { Sheet } from './paint-lines.js';
import { layOut, projected, unprojected, type Projection } from './projection.js';
import { drawView } from './view-shapes.js';

/** Which views of which kind stand on a sheet of which size. */
export interface SheetRequest {
  readonly kind: string;
  /** In this order; left out: all that the kind has. */
  readonly views?: readonly ViewName[];
  /** Width of the sheet in CSS pixels, from about 320. */
  readonly widthPx: number;
  /** The sheet then stays within it, the garment smaller where it must be. */
  readonly mostHeightPx?: number;
}

/** The views that are asked for, drawn, each at its place; undefined where the kind has no diagram. */
export function sheetOf(request: SheetRequest): (Sheet & { readonly diagram: GarmentDiagram }) | undefined {
  const diagram = diagramFor(request.kind);
  if (!diagram) return undefined;
  const names = request.views ?? diagram.views.map((view) => view.name);
  const views = names.flatMap((name) => diagram.views.filter((view) => view.name === name));
  const drawings = views.map(drawView);
  const size = {
    width: request.widthPx,
    ...(request.mostHeightPx === undefined ? {} : { mostHeight: request.mostHeightPx }),
  };
  return { diagram, views, drawings, layout: layOut(drawings, size, diagram.leastScale) };
}

/** Where a view stands on its sheet, so that a tap can be turned into millimetres and a place into pixels. */
export interface ViewPlace {
  readonly view: ViewName;
  /** What the drawing takes up, in the view's millimetres. */
  readonly extent: Box;
  readonly projection: Projection;
}

/** The places of the views of a diagram painted to the same request. Empty where the kind has no diagram. */
export function viewPlaces(request: SheetRequest): readonly ViewPlace[] {
  const sheet = sheetOf(request);
  if (!sheet) return [];
  return sheet.views.flatMap(({ name }, index) => {
    const [drawing, place] = [sheet.drawings[index], sheet.layout.places[index]];
    return drawing && place ? [{ view: name, extent: drawing.bounds, projection: place.projection }] : [];
  });
}

/** A place of the view, in millimetres, on the sheet, in pixels. */
export const onSheet = ({ projection }: ViewPlace, millimetres: Point): Point =>
  projected(projection)(millimetres);

/** A place on the sheet, in pixels, in the view's millimetres, held within its extent. */
export function onGarment({ projection, extent }: ViewPlace, pixels: Point): Point {
  const [x, y] = unprojected(projection)(pixels);
  return [Math.min(extent.right, Math.max(extent.left, x)), Math.min(extent.bottom, Math.max(extent.top, y))];
}
