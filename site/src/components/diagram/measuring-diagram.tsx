import type { GarmentKind } from '@ellwand/shared/points/kinds';
import type { OwnLine } from '@ellwand/shared/drawings/diagram/own-line';
import { LitDrawing } from './lit-drawing';
import type { LitPoints } from './lit-points';

interface MeasuringDiagramProps {
  readonly kind: GarmentKind;
  /** Only these points are drawn. */
  readonly points: readonly string[];
  readonly letters: ReadonlyMap<string, string>;
  /** Lines of points that the museum made for itself. */
  readonly ownLines?: readonly OwnLine[];
  readonly lit: LitPoints;
  /** Keeps the ids of this drawing apart from others on the page. */
  readonly prefix: string;
}

/** Drawn for two widths of sheet, so that strokes and letters keep their size on a phone. */
const WIDE_PX = 700;
const NARROW_PX = 356;

/** A kind's diagram with the lines of the points that were measured. */
export function MeasuringDiagram({ kind, points, letters, ownLines, lit, prefix }: MeasuringDiagramProps) {
  const sheet = (widthPx: number) => {
    return { kind, points, letters, ownLines, widthPx, idPrefix: `${prefix}-${widthPx}` };
  };
  return (
    <figure className="diagram">
      <LitDrawing sheet={sheet(WIDE_PX)} lit={lit} className="drawing-sheet only-wide" />
      <LitDrawing sheet={sheet(NARROW_PX)} lit={lit} className="drawing-sheet only-narrow" />
      <figcaption>
        Where the tape lay. Solid line: read from end to end. Broken line: half, doubled. Double ring: all
        round. The outline is the kind’s, not drawn from these figures.
      </figcaption>
    </figure>
  );
}
