import type { PublishedGarment } from '@ellwand/shared/records/published-garment';
import { SiteLink } from '../../components/ui/site-link';
import { paths } from '../../config/paths';
import { dayText } from '../../lib/words';

const stateWords = { current: 'current', superseded: 'superseded', withdrawn: 'withdrawn' } as const;

/** Every version that was published; each keeps its own address. */
export function Versions({ garment }: { readonly garment: PublishedGarment }) {
  const versions = [...garment.versions].sort((a, b) => b.version - a.version);
  return (
    <section>
      <h2>Versions</h2>
      <ol className="versions">
        {versions.map(({ version, publishedAt, state }) => (
          <li key={version}>
            <SiteLink className="link" to={paths.version(garment.number, version)}>
              Version {version}
            </SiteLink>
            , <time dateTime={publishedAt}>{dayText(publishedAt)}</time> ({stateWords[state]})
          </li>
        ))}
      </ol>
    </section>
  );
}
