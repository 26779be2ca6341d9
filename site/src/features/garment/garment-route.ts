import type { PublishedGarment } from '@ellwand/shared/records/published-garment';
import { type PageHead, pageHandle } from '../../app/page-handle';
import type { GarmentPageData } from './garment-loader';
import { paths } from '../../config/paths';
import { kindName } from '../../lib/words';

export { GarmentPage as Component } from './garment-page';

const statuses = { garment: 200, withdrawn: 410, nothing: 404 } as const;

export const handle = pageHandle<GarmentPageData>({
  head: ({ found }, { url }) => {
    if (found.found === 'garment') return garmentHead(found.garment, url.pathname);
    const title =
      found.found === 'withdrawn' ? 'This garment is no longer shown' : 'Nothing is kept at this address';
    return { title, description: `${title}.`, canonicalPath: url.pathname, unlisted: true };
  },
  status: ({ found }) => statuses[found.found],
});

function garmentHead(garment: PublishedGarment, pathname: string): PageHead {
  const { number, version, title, date, kind } = garment;
  const count = garment.parts.reduce((sum, part) => sum + part.measurements.length, 0);
  const opening = `${kindName(kind)}, ${date.display}, with ${count} measurements.`;
  return {
    title: `${title}, ${date.display}`,
    description: `${opening} ${garment.description}`.slice(0, 300).trim(),
    canonicalPath: pathname,
    image: garment.images[0] ?? null,
    links: [
      { rel: 'cite-as', href: paths.version(number, version) },
      { rel: 'license', href: garment.rights.uri },
    ],
  };
}
