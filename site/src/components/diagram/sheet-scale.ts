import type { ViewName } from '@ellwand/shared/drawings/diagram/model';
import { layOut } from '@ellwand/shared/drawings/diagram/projection';
import { drawView } from '@ellwand/shared/drawings/diagram/view-shapes';
import { diagramFor } from '@ellwand/shared/drawings/kinds/diagram-for';
import type { GarmentKind } from '@ellwand/shared/points/kinds';

/** Pixels to the millimetre of a kind's diagram on a sheet of this width: what the tape beside it needs. */
export function sheetScale(
  kind: GarmentKind,
  names: readonly ViewName[] | undefined,
  widthPx: number,
): number {
  const diagram = diagramFor(kind);
  const all = diagram?.views ?? [];
  const views = names === undefined ? all : names.flatMap((name) => all.filter((view) => view.name === name));
  const layout = layOut(views.map(drawView), { width: widthPx }, diagram?.leastScale ?? 0);
  return layout.places[0]?.projection.scale ?? 1;
}
