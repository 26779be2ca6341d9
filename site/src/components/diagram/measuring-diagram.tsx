import { paintDiagram } from '@ellwand/shared/drawings/diagram/paint-diagram';
import { diagramFor } from '@ellwand/shared/drawings/kinds/diagram-for';
import { type GarmentKind } from '@ellwand/shared/points/kinds';
import { useMemo } from 'react';
import { type LitPoints } from './lit-points';
import { SceneDrawing } from './scene-drawing';

interface MeasuringDiagramProps {
  readonly kind: GarmentKind;
  /** Only these points are drawn. */
  readonly points: readonly string[];
  readonly letters: ReadonlyMap<string, string>;
  readonly lit: LitPoints;
  /** Keeps the ids of this drawing apart from others on the page. */
  readonly prefix: string;
}

/** Drawn for two widths of sheet, so that strokes and letters keep their size on a phone. */
const WIDE_PX = 700;
const NARROW_PX = 358;

export const hasDiagram = (kind: GarmentKind): boolean => diagramFor(kind) !== undefined;

/** A kind's diagram with the lines of the points that were measured. */
export function MeasuringDiagram(props: MeasuringDiagramProps) {
  return (
    <figure className="diagram">
      <div className="drawing-sheet only-wide">
        <Sheet {...props} widthPx={WIDE_PX} idPrefix={`${props.prefix}-wide`} />
      </div>
      <div className="drawing-sheet only-narrow">
        <Sheet {...props} widthPx={NARROW_PX} idPrefix={`${props.prefix}-narrow`} />
      </div>
      <figcaption>
        Where the tape lay. Solid line: read from end to end. Broken line: half, doubled. Double ring: all round. The
        outline is the kind’s, not drawn from these figures.
      </figcaption>
    </figure>
  );
}

interface SheetProps extends MeasuringDiagramProps {
  readonly widthPx: number;
  readonly idPrefix: string;
}

function Sheet({ kind, points, letters, lit, widthPx, idPrefix }: SheetProps) {
  const scene = useMemo(
    () => paintDiagram({ kind, points, letters, widthPx, idPrefix }),
    [kind, points, letters, widthPx, idPrefix],
  );
  return scene ? <SceneDrawing scene={scene} lit={lit} /> : null;
}
