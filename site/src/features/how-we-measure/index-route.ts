import { pageHandle } from '../../app/page-handle';
import { paths } from '../../config/paths';

export { HowWeMeasurePage as Component } from './how-we-measure-page';

export const handle = pageHandle({
  head: () => ({
    title: 'How we measure',
    description:
      'Every measuring point of the catalogue: where the tape begins and ends, how it lies, and what to watch for.',
    canonicalPath: paths.howWeMeasure(),
  }),
});
