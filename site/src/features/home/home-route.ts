import type { CatalogueFront } from '@ellwand/shared/records/site-catalogue';
import { pageHandle } from '../../app/page-handle';
import { museum } from '../../config/museum';
import { paths } from '../../config/paths';
import { counted } from '../../lib/words';

export { HomePage as Component } from './home-page';

export const handle = pageHandle<CatalogueFront>({
  head: ({ total, newest }) => ({
    title: museum.catalogueName,
    description: `${counted(total, 'garment')} of historic dress, measured inside from fastening to fastening: find them by kind, time, maker and measurement.`,
    canonicalPath: paths.home(),
    image: newest.find(({ image }) => image)?.image ?? null,
  }),
});
