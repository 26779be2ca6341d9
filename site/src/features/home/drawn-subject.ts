import { diagramFor } from '@ellwand/shared/drawings/kinds/diagram-for';
import { findMeasuringPoint } from '@ellwand/shared/points/measuring-points';
import { type GarmentKind } from '@ellwand/shared/points/kinds';
import { type CatalogueCard } from '@ellwand/shared/records/published-garment';
import { isKind } from '../../lib/words';

export interface DrawnMeasure {
  readonly pointId: string;
  readonly letter: string;
  readonly label: string;
  /** Null where the drawing only explains. */
  readonly valueMm: string | null;
}

export interface DrawnSubject {
  readonly kind: GarmentKind;
  readonly measures: readonly DrawnMeasure[];
  readonly card: CatalogueCard | null;
}

const LETTERS = 'ABCDEFGH';
const explained = ['waist', 'across-front', 'neck-to-hem-back'];

/** The newest garment whose figures can be drawn with at least two lines; else a bodice that only explains. */
export function chooseSubject(newest: readonly CatalogueCard[]): DrawnSubject {
  for (const card of newest) {
    if (!isKind(card.kind)) continue;
    const drawn = new Set(linesSeen(card.kind));
    const measures = card.measurements.filter(({ pointId }) => drawn.has(pointId));
    if (measures.length >= 2) return { kind: card.kind, measures: measures.map(lettered), card };
  }
  const measures = explained.map((pointId, index) =>
    lettered({ pointId, label: findMeasuringPoint(pointId)?.name ?? pointId, valueMm: null }, index),
  );
  return { kind: 'bodice', measures, card: null };
}

/** Points whose line lies on the front or the back; the inside is not shown here. */
function linesSeen(kind: GarmentKind): string[] {
  const lines = diagramFor(kind)?.lines ?? [];
  return lines.filter(({ view }) => view !== 'inside').map(({ pointId }) => pointId);
}

function lettered(
  { pointId, label, valueMm }: { pointId: string; label: string; valueMm: string | null },
  index: number,
): DrawnMeasure {
  return { pointId, label, valueMm, letter: LETTERS.charAt(index) };
}
