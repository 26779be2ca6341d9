import type { ViewName } from '@ellwand/shared/drawings/diagram/model';
import { diagramFor } from '@ellwand/shared/drawings/kinds/diagram-for';
import { findMeasuringPoint } from '@ellwand/shared/points/measuring-points';
import type { GarmentKind } from '@ellwand/shared/points/kinds';
import type { CatalogueCard } from '@ellwand/shared/records/published-garment';
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
  /** The front, and whatever else the lines lie on. */
  readonly views: readonly ViewName[];
  /** Where there is room for less. */
  readonly viewsWithLines: readonly ViewName[];
  readonly measures: readonly DrawnMeasure[];
  readonly card: Pick<CatalogueCard, 'number' | 'title' | 'dateDisplay'> | null;
}

const LETTERS = 'ABCDEFGH';
const explained = ['waist', 'across-front', 'sleeve-outer'];

/** The newest garment whose figures can be drawn with at least two lines; else a bodice that only explains. */
export function chooseSubject(newest: readonly CatalogueCard[]): DrawnSubject {
  for (const card of newest) {
    if (!isKind(card.kind)) continue;
    const lines = diagramFor(card.kind)?.lines ?? [];
    const measures = card.measurements.filter((each) =>
      lines.some(({ pointId }) => pointId === each.pointId),
    );
    if (measures.length >= 2) {
      const { number, title, dateDisplay } = card;
      return subject(card.kind, measures, { number, title, dateDisplay });
    }
  }
  const measures = explained.map((pointId) => {
    return { pointId, label: findMeasuringPoint(pointId)?.name ?? pointId, valueMm: null };
  });
  return subject('bodice', measures, null);
}

function subject(kind: GarmentKind, measures: readonly Figure[], card: DrawnSubject['card']): DrawnSubject {
  const lines = diagramFor(kind)?.lines ?? [];
  const lainOn = lines.filter((line) => measures.some(({ pointId }) => pointId === line.pointId));
  const viewsWithLines = [...new Set(lainOn.map(({ view }) => view))];
  const views = [...new Set<ViewName>(['front', ...viewsWithLines])];
  return { kind, views, viewsWithLines, measures: measures.map(lettered), card };
}

type Figure = Omit<DrawnMeasure, 'letter'>;

function lettered({ pointId, label, valueMm }: Figure, index: number): DrawnMeasure {
  return { pointId, label, valueMm, letter: LETTERS.charAt(index) };
}
