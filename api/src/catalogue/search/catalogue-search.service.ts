import { Injectable } from '@nestjs/common';
import type { SearchAnswer } from '@ellwand/shared/records/published-garment';
import type { SearchQuery } from '@ellwand/shared/records/search-query';
import type { CatalogueFront } from '@ellwand/shared/records/site-catalogue';
import { IndexUpkeep } from './index-upkeep';
import { cardOf, searchIndex } from './search-index';

const newestShown = 8;

/** The one door to searching; what stands behind it may change. */
@Injectable()
export class CatalogueSearch {
  constructor(private readonly upkeep: IndexUpkeep) {}

  async search(query: SearchQuery): Promise<SearchAnswer> {
    return searchIndex(await this.upkeep.current(), query);
  }

  /** How many garments there are, of which kinds, and the newest of them. */
  async front(): Promise<CatalogueFront> {
    const index = await this.upkeep.current();
    const kinds = [...index.values('kind')]
      .map(([kind, { holders }]) => ({ kind, count: holders.size() }))
      .filter(({ count }) => count > 0)
      .sort((a, b) => b.count - a.count || (a.kind < b.kind ? -1 : 1));
    const newest = index.inOrder('newest').slice(0, newestShown);
    return { total: index.all.size(), kinds, newest: newest.map((place) => cardOf(index.garment(place))) };
  }
}
