import { type PublishedPart } from '@ellwand/shared/records/published-garment';
import { SiteLink } from '../../components/ui/site-link';
import { paths } from '../../config/paths';
import { reasonWords } from './measuring-words';

/** The points that could not be taken, each with its reason. */
export function NotTaken({ part }: { readonly part: PublishedPart }) {
  if (part.notTaken.length === 0) return null;
  return (
    <div className="not-taken">
      <h3>Not taken</h3>
      <ul>
        {part.notTaken.map(({ pointId, label, reason }) => (
          <li key={pointId}>
            <SiteLink to={paths.point(pointId)}>{label}</SiteLink>: {reasonWords[reason]}
          </li>
        ))}
      </ul>
    </div>
  );
}
