import type { PublishedDocument, PublishedPart } from '@ellwand/shared/records/published-garment';
import { notTakenReasons } from '@ellwand/shared/readings/reading';
import { wornSideLabels } from '@ellwand/shared/readings/worn-side';
import { formatLength } from '@ellwand/shared/units/format-length';
import { mm } from '@ellwand/shared/units/length';
import { staffPicture } from '../../../config/paths.js';
import { dayText } from '../../../lib/moments.js';
import { kindWord } from '../../../lib/words/kind-word.js';

/** The record as the public will see it: what is not here will not be there. */
export function Preview({ garment }: { readonly garment: PublishedDocument }) {
  const facts: readonly (readonly [string, string | null])[] = [
    ['Number', garment.ownNumber],
    ['Kind', kindWord(garment.kind)],
    ['Maker', garment.maker],
    ['Label', garment.label && `“${garment.label.transcription}”, ${garment.label.where}`],
    ['Place', garment.place],
    ['Materials', garment.materials.join(', ')],
    ['Techniques', garment.techniques.join(', ')],
    ['Colours', garment.colours.join(', ')],
    ['Fastenings', garment.fastenings],
    ['Lining', garment.lining],
    ['Alterations', garment.alterations],
    ['Condition', garment.condition],
    ['Wearer and occasion', garment.wearer],
    ['References', garment.references],
    ['Other numbers', garment.otherNumbers.map(({ kind, number }) => `${kind} ${number}`).join(', ')],
    ['Hazards', garment.hazards.map(({ id, standing }) => `${id}, ${standing}`).join('; ')],
    ['Credit', garment.creditLine],
    ['Rights', garment.rights.label],
  ];
  return (
    <article aria-label="As the public will see it" className="border border-hair bg-sheet p-5 sm:p-8">
      <p className="text-label text-ink-3">As the public will see it</p>
      <h2 className="title mt-1 text-title-34">{garment.title}</h2>
      <p className="title text-title-25 italic text-ink-2">{garment.date.display}</p>
      {garment.description && (
        <p className="mt-4 max-w-text whitespace-pre-line text-body">{garment.description}</p>
      )}
      {garment.images.length > 0 && (
        <ul className="mt-5 grid grid-cols-3 gap-3 sm:grid-cols-4">
          {garment.images.map(({ id, alt, caption, widths }) => (
            <li key={id}>
              <img
                src={staffPicture(id, widths[0] ?? 320)}
                alt={alt}
                loading="lazy"
                className="aspect-4/5 w-full bg-well object-cover object-top"
              />
              <p className="mt-1 line-clamp-2 text-label text-ink-3">{caption}</p>
            </li>
          ))}
        </ul>
      )}
      <dl className="mt-5 border-t border-hair text-table">
        {facts
          .filter(([, value]) => value)
          .map(([label, value]) => (
            <div
              key={label}
              className="grid gap-x-4 border-b border-hair py-1.5 sm:grid-cols-[10rem_minmax(0,1fr)]"
            >
              <dt className="text-ink-3">{label}</dt>
              <dd className="whitespace-pre-line break-words">{value}</dd>
            </div>
          ))}
      </dl>
      {garment.parts.map((part) => (
        <PreviewPart key={part.number} part={part} />
      ))}
    </article>
  );
}

function PreviewPart({ part }: { readonly part: PublishedPart }) {
  const measured = [
    part.measuredOn && `Measured ${dayText(part.measuredOn)}`,
    part.measuredBy.length > 0
      ? `by ${part.measuredBy.join(' and ')}`
      : `by ${part.peopleCount} ${part.peopleCount === 1 ? 'person' : 'people'}`,
  ];
  return (
    <section className="mt-6">
      <h3 className="title text-title-25">{part.name}</h3>
      {part.measuredOn && <p className="text-label text-ink-3">{measured.filter(Boolean).join(' ')}</p>}
      {part.measurements.length === 0 ? (
        <p className="text-table text-ink-3">Not measured.</p>
      ) : (
        <Measurements part={part} />
      )}
      {part.notTaken.length > 0 && (
        <p className="mt-2 text-label text-ink-3">
          Not taken:{' '}
          {part.notTaken
            .map(
              ({ label, worn, reason }) =>
                `${worn ? `${label}, ${wornSideLabels[worn]}` : label} (${notTakenReasons[reason].toLowerCase()})`,
            )
            .join('; ')}
          .
        </p>
      )}
    </section>
  );
}

function Measurements({ part }: { readonly part: PublishedPart }) {
  return (
    <table className="mt-2 w-full text-table">
      <caption className="sr-only">Measurements of {part.name}</caption>
      <thead className="border-b border-ink text-left text-label text-ink-2">
        <tr>
          <th scope="col" className="py-1 font-medium">
            Point
          </th>
          <th scope="col" className="py-1 text-right font-medium">
            mm
          </th>
          <th scope="col" className="py-1 text-right font-medium">
            ± mm
          </th>
          <th scope="col" className="py-1 text-right font-medium">
            in
          </th>
        </tr>
      </thead>
      <tbody className="figures">
        {part.measurements.map(({ pointId, label, worn, valueMm, uncertaintyMm }) => (
          <tr key={`${pointId} ${worn}`} className="border-b border-hair">
            <th scope="row" className="py-1 text-left font-normal">
              {label}
              {worn && `, ${wornSideLabels[worn]}`}
            </th>
            <td className="py-1 text-right">{formatLength(mm(valueMm), 'mm').replace(' mm', '')}</td>
            <td className="py-1 text-right text-ink-3">{uncertaintyMm}</td>
            <td className="py-1 text-right">{formatLength(mm(valueMm), 'in').replace(' in', '')}</td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}
