import { SearchQuery } from '@ellwand/shared/records/search-query';
import { mm } from '@ellwand/shared/units/length';
import { type IndexedGarment, namedPoint } from '../../src/catalogue/search/indexed-garment';

let made = 0;

/** Measurements as `[point, millimetres, part]`; facets as `{ kind: ['dress'] }`. */
export interface GarmentSketch {
  readonly number?: string;
  readonly title?: string;
  readonly years?: readonly [number, number];
  readonly facets?: Readonly<Record<string, readonly string[]>>;
  readonly measurements?: readonly (readonly [point: string, value: number, part?: string])[];
  readonly text?: string;
  readonly publishedAt?: number;
  readonly measuredOn?: string;
}

/** A garment of the index, with whatever a spec leaves out made up. */
export function indexedGarment(sketch: GarmentSketch): IndexedGarment {
  const [fromYear, toYear] = sketch.years ?? [1885, 1885];
  const facets = Object.entries(sketch.facets ?? {}).flatMap(([facet, values]) =>
    values.map((value) => ({ facet, value, label: value.toUpperCase() })),
  );
  return {
    number: sketch.number ?? `lh-${++made}`,
    title: sketch.title ?? 'Day dress',
    kind: sketch.facets?.['kind']?.[0] ?? 'dress',
    dateDisplay: `${fromYear}`,
    fromYear,
    toYear,
    publishedAt: sketch.publishedAt ?? 0,
    measuredOn: sketch.measuredOn ?? '',
    image: null,
    facets,
    measurements: (sketch.measurements ?? []).map(([pointId, value, partName = 'Dress']) => ({
      ...namedPoint(pointId),
      partName,
      value: mm(value),
    })),
    text: sketch.text ?? '',
  };
}

/** A search as it comes from an address. */
export function query(
  parts: Readonly<Record<string, string | number | readonly string[]>> = {},
): SearchQuery {
  return SearchQuery.parse(parts);
}
