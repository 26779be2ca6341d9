import { paths } from '../../config/paths';
import { isNarrowed, searchParams } from '../../lib/search-address';
import { counted } from '../../lib/words';
import { pageHandle } from '../../app/page-handle';
import type { SearchFound } from './search-loader';

export { SearchPage as Component } from './search-page';

export const handle = pageHandle<SearchFound>({
  head: ({ query, answer }) => ({
    title: isNarrowed(query) ? `${counted(answer.total, 'garment')} found` : 'Search the catalogue',
    description: `${counted(answer.total, 'garment')}, each with its measurements in millimetres, centimetres and inches.`,
    canonicalPath: paths.search(searchParams(query).toString()),
    unlisted: isNarrowed(query) && answer.total === 0,
  }),
});
