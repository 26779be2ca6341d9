import type { PublishedPart } from '@ellwand/shared/records/published-garment';
import { reasonWords, sidedKey } from './measuring-words';
import { PointName } from './point-name';

/** The points that could not be taken, each with its reason. */
export function NotTaken({ part }: { readonly part: PublishedPart }) {
  if (part.notTaken.length === 0) return null;
  return (
    <div className="not-taken">
      <h3>Not taken</h3>
      <ul>
        {part.notTaken.map((point) => (
          <li key={sidedKey(point)}>
            <PointName part={part} point={point} />: {reasonWords[point.reason]}
          </li>
        ))}
      </ul>
    </div>
  );
}
