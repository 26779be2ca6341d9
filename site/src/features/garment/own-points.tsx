import type { PublishedPart } from '@ellwand/shared/records/published-garment';

/** Where the museum measured what the catalogue's points do not: each in words, for those that have a figure. */
export function OwnPoints({ part }: { readonly part: PublishedPart }) {
  const told = new Set([...part.measurements, ...part.notTaken].map(({ pointId }) => pointId));
  const points = part.ownPoints.filter(({ id }) => told.has(id));
  if (points.length === 0) return null;
  return (
    <div className="derived">
      <h3>{points.length === 1 ? 'A point of this museum’s own' : 'Points of this museum’s own'}</h3>
      <dl>
        {points.map(({ id, name, definition, from, to }) => (
          <div key={id}>
            <dt>{name}</dt>
            <dd>
              {definition}
              <span className="measures-how">
                From {from} to {to}.
              </span>
            </dd>
          </div>
        ))}
      </dl>
    </div>
  );
}
