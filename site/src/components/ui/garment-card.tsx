import type { CatalogueCard } from '@ellwand/shared/records/published-garment';
import { Picture } from './picture';
import { SiteLink } from './site-link';
import { Length } from '../units/length';
import { paths } from '../../config/paths';
import { kindName } from '../../lib/words';

interface GarmentCardProps {
  readonly card: CatalogueCard;
  readonly heading: 'h2' | 'h3';
  readonly sizes: string;
  readonly first?: boolean;
}

/** A garment in a list: its picture, what it is, and the three measurements that say most. */
export function GarmentCard({ card, heading: Heading, sizes, first = false }: GarmentCardProps) {
  return (
    <article className="card">
      <div className="card-picture">
        {card.image ? (
          <Picture image={card.image} sizes={sizes} first={first} />
        ) : (
          <p className="card-no-picture">{kindName(card.kind)}: no picture yet</p>
        )}
      </div>
      <Heading className="card-title">
        <SiteLink to={paths.garment(card.number)}>{card.title}</SiteLink>
      </Heading>
      <p className="card-date">{card.dateDisplay}</p>
      <dl className="card-measures">
        {card.measurements.map((measurement) => (
          <div key={`${measurement.partName} ${measurement.pointId}`}>
            <dt>{measurement.label}</dt>
            <dd>
              <Length mm={measurement.valueMm} />
            </dd>
          </div>
        ))}
      </dl>
    </article>
  );
}
