import { type PublishedPart } from '@ellwand/shared/records/published-garment';
import { SiteLink } from '../../components/ui/site-link';
import { paths } from '../../config/paths';

interface PointNameProps {
  readonly part: PublishedPart;
  readonly pointId: string;
  readonly label: string;
}

/** A point's name, leading to its page; a point of the museum's own has none, and is defined beneath the table. */
export function PointName({ part, pointId, label }: PointNameProps) {
  if (part.ownPoints.some(({ id }) => id === pointId)) return <>{label}</>;
  return <SiteLink to={paths.point(pointId)}>{label}</SiteLink>;
}
