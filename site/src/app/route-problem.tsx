import { useRevalidator } from 'react-router-dom';
import { SiteLink } from '../components/ui/site-link';
import { paths } from '../config/paths';

/** Stands in the place of a page that could not be fetched or drawn. */
export function RouteProblem() {
  const revalidator = useRevalidator();
  return (
    <div className="wide notice">
      <h1 className="notice-title">This page could not be fetched</h1>
      <p>
        The catalogue did not answer as it should. Nothing is lost; it often helps to ask once more in a
        moment.
      </p>
      <p className="notice-actions">
        <button type="button" className="button" onClick={() => void revalidator.revalidate()}>
          {revalidator.state === 'loading' ? 'Asking again' : 'Ask again'}
        </button>
        <SiteLink to={paths.home()} className="button-quiet">
          Go to the first page
        </SiteLink>
      </p>
    </div>
  );
}
