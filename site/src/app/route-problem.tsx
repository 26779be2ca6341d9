import { useLocation } from 'react-router-dom';
import { SiteLink } from '../components/ui/site-link';
import { paths } from '../config/paths';

/** Stands in the place of a page that could not be fetched or drawn. Asking again is a link: it needs no script. */
export function RouteProblem() {
  const { pathname, search } = useLocation();
  return (
    <div className="wide notice">
      <h1 className="notice-title">This page could not be fetched</h1>
      <p>
        The catalogue did not answer as it should. Nothing is lost; it often helps to ask once more in a
        moment.
      </p>
      <p className="notice-actions">
        <a href={pathname + search} className="button">
          Ask again
        </a>
        <SiteLink to={paths.home()} className="button-quiet">
          Go to the first page
        </SiteLink>
      </p>
    </div>
  );
}
