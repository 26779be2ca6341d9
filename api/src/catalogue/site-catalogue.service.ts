import { Injectable } from '@nestjs/common';
import type { SearchAnswer } from '@ellwand/shared/records/published-garment';
import type { SearchQuery } from '@ellwand/shared/records/search-query';
import type { CatalogueFront, GarmentFound, SiteCatalogue } from '@ellwand/shared/records/site-catalogue';
import { PublishedGarments } from './published-garments.service';
import { CatalogueSearch } from './search/catalogue-search.service';

/** The catalogue for pages that are rendered in this process: the same answers as over HTTP, without the way. */
@Injectable()
export class InProcessCatalogue implements SiteCatalogue {
  constructor(
    private readonly searching: CatalogueSearch,
    private readonly garments: PublishedGarments,
  ) {}

  search(query: SearchQuery): Promise<SearchAnswer> {
    return this.searching.search(query);
  }

  garment(number: string, version?: number): Promise<GarmentFound> {
    return this.garments.find(number, version);
  }

  front(): Promise<CatalogueFront> {
    return this.searching.front();
  }
}
