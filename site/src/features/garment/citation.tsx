import type { PublishedGarment } from '@ellwand/shared/records/published-garment';
import { SiteLink } from '../../components/ui/site-link';
import { paths } from '../../config/paths';
import { dayText } from '../../lib/words';

interface CitationProps {
  readonly garment: PublishedGarment;
  readonly origin: string;
}

/** How to cite the page, its permanent address, whose it is and under which terms. */
export function Citation({ garment, origin }: CitationProps) {
  const { museum, ownNumber, title, date, number, version, publishedAt } = garment;
  return (
    <section>
      <h2>Cite this page</h2>
      <p>
        {museum}, {ownNumber}: {title}, {date.display}. Version {version}, {dayText(publishedAt)}.{' '}
        {origin + paths.version(number, version)}
      </p>
      <dl className="facts">
        <div>
          <dt>Permanent address</dt>
          <dd>
            <SiteLink className="link" to={paths.garment(number)}>
              {origin + paths.garment(number)}
            </SiteLink>
          </dd>
        </div>
        <div>
          <dt>Credit</dt>
          <dd>{garment.creditLine}</dd>
        </div>
        <div>
          <dt>Terms</dt>
          <dd>
            <a className="link" href={garment.rights.uri} rel="license">
              {garment.rights.label}
            </a>
          </dd>
        </div>
      </dl>
    </section>
  );
}
