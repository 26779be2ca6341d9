import { SiteLink } from '../ui/site-link';
import { paths } from '../../config/paths';

/** Also for a garment that was never published: the two cannot be told apart from outside. */
export function NotFoundPage() {
  return (
    <div className="wide notice">
      <h1 className="notice-title">Nothing is kept at this address</h1>
      <p>
        The address may have been typed or copied with a slip in it. Addresses of garments look like this:
        larkmoor.example/g/lh-1966-30.
      </p>
      <p className="notice-actions">
        <SiteLink to={paths.search()} className="button">
          Search the catalogue
        </SiteLink>
        <SiteLink to={paths.home()} className="button-quiet">
          Go to the first page
        </SiteLink>
      </p>
    </div>
  );
}
