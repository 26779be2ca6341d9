import { isGarmentKind, kindLabels } from '@ellwand/shared/points/kinds';
import type { PublishedDocument, PublishedMeasurement } from '@ellwand/shared/records/published-garment';

export interface FacetRow {
  readonly facet: string;
  readonly value: string;
  readonly label: string;
}

export interface MeasurementRow {
  readonly partNumber: string;
  readonly partName: string;
  readonly pointId: string;
  readonly valueMm: string;
  /** Where the point is the museum's own: the group it is searched in and what it is called; else null. */
  readonly ownGroup: string | null;
  readonly ownLabel: string | null;
}

const wornByLabels: Readonly<Record<string, string>> = {
  woman: 'Women',
  man: 'Men',
  child: 'Children',
  unknown: 'Not known',
};

/** What a garment is found by, apart from its measurements: one row for each facet and value. */
export function facetRows(document: PublishedDocument): FacetRow[] {
  const kinds = new Set([document.kind, ...document.parts.map((part) => part.kind)]);
  const rows: FacetRow[] = [...kinds].map((kind) => ({ facet: 'kind', value: kind, label: kindLabel(kind) }));
  for (const decade of decades(document.date))
    rows.push({ facet: 'decade', value: `${decade}`, label: `${decade}s` });
  rows.push({
    facet: 'worn-by',
    value: document.wornBy,
    label: wornByLabels[document.wornBy] ?? document.wornBy,
  });
  const words = (facet: string, values: readonly (string | null)[]) =>
    values.flatMap((value) => (value ? [{ facet, value, label: capitalised(value) }] : []));
  rows.push(
    ...words('maker', [document.maker]),
    ...words('place', [document.place]),
    ...words('material', document.materials),
    ...words('technique', document.techniques),
    ...words('colour', document.colours),
  );
  return onceEach(rows);
}

function kindLabel(kind: string): string {
  return isGarmentKind(kind) ? kindLabels[kind].plural : 'Sets';
}

/** Every decade that a span of years touches: 1858–1861 is found in the 1850s and in the 1860s. */
function decades({ fromYear, toYear }: PublishedDocument['date']): number[] {
  const first = Math.floor(fromYear / 10) * 10;
  const count = Math.min(20, (Math.floor(toYear / 10) * 10 - first) / 10 + 1);
  return Array.from({ length: count }, (_, index) => first + index * 10);
}

function capitalised(text: string): string {
  return text.charAt(0).toUpperCase() + text.slice(1);
}

/** The database holds a value once per facet and compares without regard to case or accents. */
function onceEach(rows: readonly FacetRow[]): FacetRow[] {
  const fold = (text: string) => text.normalize('NFD').replace(/\p{M}/gu, '').toLowerCase();
  return [...new Map(rows.map((row) => [`${row.facet} ${fold(row.value)}`, row])).values()];
}

export function measurementRows(document: PublishedDocument): MeasurementRow[] {
  return document.parts.flatMap((part) =>
    onceEachPoint(part.measurements).map(({ pointId, valueMm }) => {
      const own = part.ownPoints.find(({ id }) => id === pointId);
      return {
        partNumber: part.number,
        partName: part.name,
        pointId,
        valueMm,
        ownGroup: own?.group ?? null,
        ownLabel: own?.name ?? null,
      };
    }),
  );
}

/** Of a point read on both sides the first speaks for it: a garment is found by one sleeve, not by two. */
function onceEachPoint(measurements: readonly PublishedMeasurement[]): readonly PublishedMeasurement[] {
  return measurements.filter(
    ({ pointId }, index) => measurements.findIndex((other) => other.pointId === pointId) === index,
  );
}

/** Everything that words are looked for in. */
export function searchText(document: PublishedDocument): string {
  return [
    document.title,
    document.ownNumber,
    ...document.otherNumbers.map((other) => other.number),
    kindLabel(document.kind),
    ...document.parts.map((part) => `${part.name} ${kindLabels[part.kind].singular}`),
    document.maker,
    document.place,
    document.label?.transcription,
    ...document.materials,
    ...document.techniques,
    ...document.colours,
    document.description,
    document.fastenings,
    document.wearer,
  ]
    .filter((text) => text)
    .join('\n');
}
