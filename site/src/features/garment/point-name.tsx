import type { PublishedPart } from '@ellwand/shared/records/published-garment';
import { wornSideLabels } from '@ellwand/shared/readings/worn-side';
import { SiteLink } from '../../components/ui/site-link';
import { paths } from '../../config/paths';

interface PointNameProps {
  readonly part: PublishedPart;
  readonly point: PublishedPart['notTaken'][number] | PublishedPart['measurements'][number];
}

/** A point's name, leading to its page; a point of the museum's own has none, and is defined beneath the table. */
export function PointName({ part, point: { pointId, label, worn } }: PointNameProps) {
  const own = part.ownPoints.some(({ id }) => id === pointId);
  return (
    <>
      {own ? label : <SiteLink to={paths.point(pointId)}>{label}</SiteLink>}
      {worn && `, ${wornSideLabels[worn]}`}
    </>
  );
}
