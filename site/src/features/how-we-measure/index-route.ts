import type { GarmentKind } from '@ellwand/shared/points/kinds';
import { pageHandle } from '../../app/page-handle';
import { paths } from '../../config/paths';
import { kindsName } from '../../lib/words';
import { FIRST_KIND, kindOf } from './kind-of';

export { HowWeMeasurePage as Component } from './how-we-measure-page';

export const handle = pageHandle({
  head: (_data, { url }) => ({
    title: titleFor(kindOf(url.searchParams)),
    description:
      'Every measuring point of the catalogue: where the tape begins and ends, how it lies, and what to watch for.',
    canonicalPath: paths.kindMeasured(kindOf(url.searchParams)),
  }),
});

function titleFor(kind: GarmentKind): string {
  return kind === FIRST_KIND ? 'How we measure' : `How we measure ${kindsName(kind).toLowerCase()}`;
}
