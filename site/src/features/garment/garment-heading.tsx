import type { PublishedGarment, PublishedImage } from '@ellwand/shared/records/published-garment';
import { Picture } from '../../components/ui/picture';
import { SiteLink } from '../../components/ui/site-link';
import { paths } from '../../config/paths';
import { capitalised, isKind, kindName } from '../../lib/words';

const wornByWords: Readonly<Record<string, string>> = { woman: 'A woman', man: 'A man', child: 'A child' };

/** Title, date and the facts that place a garment. */
export function GarmentHeading({ garment }: { readonly garment: PublishedGarment }) {
  const facts: readonly (readonly [string, string | null])[] = [
    ['Number', garment.ownNumber],
    ['Made for', wornByWords[garment.wornBy] ?? null],
    ['Maker', garment.maker],
    ['Place', garment.place],
    ['Materials', listed(garment.materials)],
    ['Techniques', listed(garment.techniques)],
    ['Colours', listed(garment.colours)],
    ...garment.otherNumbers.map(
      ({ kind, number }) => [`${capitalised(kind)} number`, number] as readonly [string, string],
    ),
  ];
  return (
    <header className="garment-heading">
      <div className="garment-name">
        <div>
          <h1>{garment.title}</h1>
          <p className="garment-date">{garment.date.display}</p>
        </div>
        <FirstPicture image={garment.images[0]} />
      </div>
      <dl className="facts">
        <div>
          <dt>Kind</dt>
          <dd>
            {isKind(garment.kind) ? (
              <SiteLink className="link" to={paths.kind(garment.kind)}>
                {kindName(garment.kind)}
              </SiteLink>
            ) : (
              'Set'
            )}
          </dd>
        </div>
        {facts.map(([name, value]) =>
          value ? (
            <div key={name}>
              <dt>{name}</dt>
              <dd>{value}</dd>
            </div>
          ) : null,
        )}
      </dl>
    </header>
  );
}

/** What it looks like, before anything is read; the way to all its pictures, which say the rest. */
function FirstPicture({ image }: { readonly image: PublishedImage | undefined }) {
  if (!image) return null;
  return (
    <a className="garment-first-picture" href="#pictures" aria-label="To the pictures">
      <Picture image={{ ...image, alt: '' }} sizes="(width >= 40rem) 168px, 112px" first />
    </a>
  );
}

function listed(values: readonly string[]): string | null {
  return values.length === 0 ? null : capitalised(values.join(', '));
}
