import type { PublishedPart } from '@ellwand/shared/records/published-garment';
import { counted, dayText } from '../../lib/words';
import { supportText } from './measuring-words';

/** When and how the part was measured. */
export function PartFacts({ part }: { readonly part: PublishedPart }) {
  const people =
    part.measuredBy.length > 0 ? part.measuredBy.join(', ') : counted(part.peopleCount, 'person', 'people');
  const facts: readonly (readonly [string, string | null])[] = [
    ['Part', part.number],
    ['Measured', part.measuredOn && dayText(part.measuredOn)],
    ['By', part.measuredOn && people],
    ['Support', part.support && supportText(part.support)],
    ['Tape', part.tape],
    ['Fastening pair', part.fasteningPair || null],
  ];
  return (
    <dl className="facts facts-small">
      {facts.map(([name, value]) =>
        value ? (
          <div key={name}>
            <dt>{name}</dt>
            <dd>{value}</dd>
          </div>
        ) : null,
      )}
    </dl>
  );
}
