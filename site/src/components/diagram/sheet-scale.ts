import { type ViewName } from '@ellwand/shared/drawings/diagram/model';
import { layOut } from '@ellwand/shared/drawings/diagram/projection';
import { drawView } from '@ellwand/shared/drawings/diagram/view-shapes';
import { diagramFor } from '@ellwand/shared/drawings/kinds/diagram-for';
import { type GarmentKind } from '@ellwand/shared/points/kinds';

/** Pixels to the millimetre of a kind's diagram on a sheet of this width: what the tape beside it needs. */
export function sheetScale(kind: GarmentKind, names: readonly ViewName[], widthPx: number): number {
  const diagram = diagramFor(kind);
  const views = names.flatMap((name) => diagram?.views.filter((view) => view.name === name) ?? []);
  const layout = layOut(views.map(drawView), widthPx, diagram?.leastScale ?? 0);
  return layout.places[0]?.projection.scale ?? 1;
}
