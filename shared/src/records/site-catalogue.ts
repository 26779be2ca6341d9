import type { CatalogueCard, PublishedGarment, SearchAnswer, WithdrawalNotice } from './published-garment.js';
import type { SearchQuery } from './search-query.js';

/** What the catalogue knows of a public number. A number that was never published is nothing at all. */
export type GarmentFound =
  | { readonly found: 'garment'; readonly garment: PublishedGarment }
  | { readonly found: 'withdrawn'; readonly notice: WithdrawalNotice }
  | { readonly found: 'nothing' };

/** The front page's figures. */
export interface CatalogueFront {
  readonly total: number;
  readonly kinds: readonly { readonly kind: string; readonly count: number }[];
  readonly newest: readonly CatalogueCard[];
}

/**
 * The catalogue's door as the public pages see it. Rendered on the server the API hands one in that reads the
 * published tables; in the browser another one asks the same things over HTTP.
 */
export interface SiteCatalogue {
  search(query: SearchQuery): Promise<SearchAnswer>;
  garment(number: string, version?: number): Promise<GarmentFound>;
  front(): Promise<CatalogueFront>;
}
