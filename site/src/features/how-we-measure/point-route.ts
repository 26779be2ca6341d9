import { findMeasuringPoint } from '@ellwand/shared/points/measuring-points';
import { pageHandle } from '../../app/page-handle';
import { paths } from '../../config/paths';

export { PointPage as Component } from './point-page';

/** The point of the address, or null for an id that names none. */
export const loader = ({ params }: { params: { pointId?: string } }) =>
  findMeasuringPoint(params.pointId ?? '')?.id ?? null;

export const handle = pageHandle<string | null>({
  head: (pointId) => {
    const point = findMeasuringPoint(pointId ?? '');
    if (!point) {
      const title = 'No such measuring point';
      return { title, description: `${title}.`, canonicalPath: paths.howWeMeasure(), unlisted: true };
    }
    return {
      title: `${point.name}: how we measure`,
      description: point.definition,
      canonicalPath: paths.point(point.id),
    };
  },
  status: (pointId) => (pointId === null ? 404 : 200),
});
