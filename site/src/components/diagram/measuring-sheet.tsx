import { type ViewName } from '@ellwand/shared/drawings/diagram/model';
import { paintDiagram } from '@ellwand/shared/drawings/diagram/paint-diagram';
import { type GarmentKind } from '@ellwand/shared/points/kinds';
import { SceneDrawing } from './scene-drawing';
import { sheetScale } from './sheet-scale';

export interface MeasuringSheetProps {
  readonly kind: GarmentKind;
  /** Only these points are drawn. */
  readonly points: readonly string[];
  readonly letters: ReadonlyMap<string, string>;
  readonly views?: readonly ViewName[];
  readonly widthPx: number;
  /** Keeps the ids of this drawing apart from others on the page. */
  readonly idPrefix: string;
  /** Whether the tape stands at its left, in the drawing's own scale. */
  readonly tape?: boolean;
}

/** A kind's measuring diagram on a sheet of one width; nothing for a kind that is not drawn. */
export default function MeasuringSheet({ tape = false, ...request }: MeasuringSheetProps) {
  const scene = paintDiagram(request);
  if (!scene) return null;
  const scale = tape ? sheetScale(request.kind, request.views, request.widthPx) : null;
  return <SceneDrawing scene={scene} tapeMmPerPx={scale === null ? null : 1 / scale} />;
}
