import { isPointGroup, type PointGroup } from '@ellwand/shared/points/groups';
import { findMeasuringPoint } from '@ellwand/shared/points/measuring-points';
import type { PublishedImage } from '@ellwand/shared/records/published-garment';
import type { Length } from '@ellwand/shared/units/length';

/** The facets that a search may name, in the order in which they are shown. */
export const facetLabels = {
  kind: 'Kind',
  decade: 'Decade',
  maker: 'Maker',
  place: 'Place',
  material: 'Material',
  colour: 'Colour',
} as const;
export type FacetName = keyof typeof facetLabels;
export const facetNames = Object.keys(facetLabels) as FacetName[];

export interface IndexedMeasurement {
  readonly pointId: string;
  /** What it is searched in; null for a point that neither the catalogue nor its garment's protocol knows. */
  readonly group: PointGroup | null;
  readonly label: string;
  readonly partName: string;
  readonly value: Length;
}

/** What the search knows of one published garment. */
export interface IndexedGarment {
  readonly number: string;
  readonly title: string;
  readonly kind: string;
  readonly dateDisplay: string;
  readonly fromYear: number;
  readonly toYear: number;
  /** Milliseconds since 1970. */
  readonly publishedAt: number;
  /** The day on which it was last measured, `2026-11-20`; empty where it was not. */
  readonly measuredOn: string;
  readonly image: PublishedImage | null;
  readonly facets: readonly { readonly facet: string; readonly value: string; readonly label: string }[];
  readonly measurements: readonly IndexedMeasurement[];
  readonly text: string;
}

/** The catalogue's words for a point, else those that its garment's protocol gave it, else its id. */
export function namedPoint(
  pointId: string,
  own: { readonly group: string | null; readonly label: string | null } = { group: null, label: null },
): Pick<IndexedMeasurement, 'pointId' | 'group' | 'label'> {
  const point = findMeasuringPoint(pointId);
  const ownGroup = own.group !== null && isPointGroup(own.group) ? own.group : null;
  return { pointId, group: point?.group ?? ownGroup, label: point?.name ?? own.label ?? pointId };
}
