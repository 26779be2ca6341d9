import type { CataloguedPoint } from '@ellwand/shared/points/measuring-points';
import { SiteLink } from '../../components/ui/site-link';
import { paths } from '../../config/paths';
import { PointFacts } from './point-facts';

/** A point in the full list; its id is also its anchor. */
export function PointEntry({ point }: { readonly point: CataloguedPoint }) {
  return (
    <article className="how-point" id={point.id}>
      <h4>
        <SiteLink to={paths.point(point.id)} className="link">
          {point.name}
        </SiteLink>
      </h4>
      <p>{point.definition}</p>
      <PointFacts point={point} />
    </article>
  );
}
