import type { Facet } from '@ellwand/shared/records/published-garment';
import type { SearchQuery } from '@ellwand/shared/records/search-query';
import type { z } from 'zod';
import type { CatalogueIndex } from './catalogue-index';
import { facetLabels, type FacetName, facetNames } from './indexed-garment';
import type { Narrowed } from './narrowed';

type FacetAnswer = z.output<typeof Facet>;

/** More makers or places than this are found by words, not by reading a list. */
const mostValues = 60;

/** How many garments each value would find, were nothing chosen in its own facet. */
export function countFacets(index: CatalogueIndex, query: SearchQuery, narrowed: Narrowed): FacetAnswer[] {
  return facetNames.map((name) => ({
    name,
    label: facetLabels[name],
    values: counted(index, name, query[name], narrowed),
  }));
}

function counted(index: CatalogueIndex, name: FacetName, chosen: readonly string[], narrowed: Narrowed) {
  const candidates = narrowed.without(name);
  const values = [...index.values(name)].map(([value, { label, holders }]) => ({
    value,
    label,
    count: holders.intersection_size(candidates),
  }));
  const shown = values.filter(({ value, count }) => count > 0 || chosen.includes(value));
  const first = shown.sort(byCount).slice(0, mostValues);
  const further = shown.slice(mostValues).filter(({ value }) => chosen.includes(value));
  const all = [...first, ...further];
  return name === 'decade' ? all.sort((a, b) => Number(a.value) - Number(b.value)) : all;
}

interface Counted {
  readonly label: string;
  readonly count: number;
}

function byCount(a: Counted, b: Counted): number {
  return b.count - a.count || (a.label < b.label ? -1 : 1);
}
