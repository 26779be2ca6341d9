import { groups } from '@ellwand/shared/points/groups';
import type { MeasuredRange } from '@ellwand/shared/records/published-garment';
import type { SearchQuery } from '@ellwand/shared/records/search-query';
import { type Length, lengthOf, toMmString, UNITS_PER_MM } from '@ellwand/shared/units/length';
import type { z } from 'zod';
import type { CatalogueIndex } from './catalogue-index';
import { measureKey } from './filters';
import type { Narrowed } from './narrowed';

type RangeAnswer = z.output<typeof MeasuredRange>;

export const mostBins = 24;
/** Offered without being asked for, in this order: what people look for first. */
const offered = [
  'bust',
  'waist',
  'hip',
  'hem',
  'back-length',
  'skirt-length',
  'sleeve',
] as const satisfies readonly (typeof groups)[number]['id'][];
const mostOffered = 4;

/** The ranges searched by, then those that say most about what was found. */
export function measuredRanges(index: CatalogueIndex, query: SearchQuery, narrowed: Narrowed): RangeAnswer[] {
  const asked = [...new Set(query.measure.map(({ point }) => point))];
  const more = offered
    .filter((group) => !asked.includes(group) && index.column(group)?.holders.intersects(narrowed.found))
    .slice(0, mostOffered);
  return [...asked, ...more].map((point) => measuredRange(index, query, narrowed, point));
}

function measuredRange(
  index: CatalogueIndex,
  query: SearchQuery,
  narrowed: Narrowed,
  point: string,
): RangeAnswer {
  const candidates = narrowed.without(measureKey(point));
  const column = index.column(point);
  const filter = query.measure.find((measure) => measure.point === point);
  const entries = column?.of(candidates) ?? [];
  return {
    point,
    label: index.label(point),
    minMm: filter?.minMm ?? null,
    maxMm: filter?.maxMm ?? null,
    missing: candidates.size() - (column?.holders.intersection_size(candidates) ?? 0),
    bins: binned(entries),
  };
}

interface Entry {
  readonly value: Length;
  readonly place: number;
}

/**
 * Garments counted in bins of one round width. A bin holds what is as long as its beginning or longer and
 * shorter than its end; a garment with two values in one bin counts once.
 * @param entries shortest first
 */
export function binned(entries: readonly Entry[]): RangeAnswer['bins'] {
  const first = entries[0];
  const last = entries.at(-1);
  if (!first || !last) return [];
  const width = roundWidth(first.value, last.value);
  const start = Math.floor(first.value / width);
  const counts = new Array<number>(Math.floor(last.value / width) - start + 1).fill(0);
  // Values come in order, so a garment is new to a bin unless that bin is the last it was counted in.
  const lastBin = new Int32Array(entries.reduce((most, { place }) => Math.max(most, place), 0) + 1).fill(-1);
  for (const { value, place } of entries) {
    const bin = Math.floor(value / width) - start;
    if (lastBin[place] !== bin) counts[bin] = (counts[bin] ?? 0) + 1;
    lastBin[place] = bin;
  }
  return counts.map((count, at) => ({
    fromMm: toMmString(lengthOf((start + at) * width)),
    toMm: toMmString(lengthOf((start + at + 1) * width)),
    count,
  }));
}

/** The smallest of 1, 2, 5, 10, 20, 50… mm that needs no more than `mostBins` bins, in units of a Length. */
function roundWidth(least: Length, most: Length): number {
  for (let decade = UNITS_PER_MM; ; decade *= 10) {
    for (const step of [1, 2, 5]) {
      const width = step * decade;
      if (Math.floor(most / width) - Math.floor(least / width) < mostBins) return width;
    }
  }
}
