import type { SearchAnswer } from '@ellwand/shared/records/published-garment';
import type { SearchQuery } from '@ellwand/shared/records/search-query';
import type { Filter } from './filters';
import type { Narrowed } from './narrowed';
import { searchAddress } from './search-address';

/** Where nothing was found: which one filter to leave out, being the one whose removal gives most. */
export function advise(
  query: SearchQuery,
  filters: readonly Filter[],
  narrowed: Narrowed,
  total: number,
): SearchAnswer['advice'] {
  if (narrowed.found.size() > 0 || filters.length === 0) return null;
  const gains = filters.map((filter) => ({ filter, gain: narrowed.without(filter.key).size() }));
  const best = gains.reduce((most, each) => (each.gain > most.gain ? each : most));
  if (best.gain === 0) {
    return {
      sentence: `Leaving out one filter finds nothing either. All ${counted(total)} are here.`,
      query: '',
    };
  }
  return {
    sentence: `Without ${best.filter.words} there ${best.gain === 1 ? 'is' : 'are'} ${counted(best.gain)}.`,
    query: searchAddress({ ...query, ...best.filter.without }),
  };
}

const counted = (count: number) => `${count} ${count === 1 ? 'garment' : 'garments'}`;
