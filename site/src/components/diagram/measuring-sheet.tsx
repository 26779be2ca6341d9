import type { ViewName } from '@ellwand/shared/drawings/diagram/model';
import type { GarmentKind } from '@ellwand/shared/points/kinds';
import type { OwnLine } from '@ellwand/shared/drawings/diagram/own-line';
import { paintProtocol } from '@ellwand/shared/protocols/own-lines';
import { remembering } from '../../lib/remember';
import { SceneDrawing } from './scene-drawing';
import { sheetScale } from './sheet-scale';

export interface MeasuringSheetProps {
  readonly kind: GarmentKind;
  /** Only these points are drawn. */
  readonly points: readonly string[];
  readonly letters: ReadonlyMap<string, string>;
  /** Lines of points that the museum made for itself. */
  readonly ownLines?: readonly OwnLine[];
  readonly views?: readonly ViewName[];
  readonly widthPx: number;
  /** Keeps the ids of this drawing apart from others on the page. */
  readonly idPrefix: string;
  /** Whether the tape stands at its left, in the drawing's own scale. */
  readonly tape?: boolean;
}

/** Placing letters is the costly part of a page; most pages ask for the drawings of a few kinds. */
const sceneFor = remembering(
  ({ kind, points, letters, views, widthPx, idPrefix, ownLines }: MeasuringSheetProps) =>
    [
      ...[kind, points, points.map((point) => letters.get(point)), views, widthPx, idPrefix],
      JSON.stringify(ownLines ?? []),
    ].join('|'),
  ({ kind, points, letters, views, widthPx, idPrefix, ownLines = [] }: MeasuringSheetProps) =>
    paintProtocol({ kind, points, letters, widthPx, idPrefix, ...(views ? { views } : {}) }, ownLines)?.scene,
  200,
);

/** A kind's measuring diagram on a sheet of one width; nothing for a kind that is not drawn. */
export default function MeasuringSheet(props: MeasuringSheetProps) {
  const scene = sceneFor(props);
  if (!scene) return null;
  const scale = props.tape ? sheetScale(props.kind, props.views, props.widthPx) : null;
  return <SceneDrawing scene={scene} tapeMmPerPx={scale === null ? null : 1 / scale} />;
}
