import type { GarmentRecord } from '@ellwand/shared/records/garment';
import { hazardLabels, standingLabels } from '@ellwand/shared/records/hazard-words';
import { kindWord } from '../../../lib/words/kind-word.js';

/** The record to read, where it cannot be written: only what was said. */
export function RecordShown({ record }: { readonly record: GarmentRecord }) {
  const rows: readonly (readonly [string, string | null])[] = [
    ['Own number', record.ownNumber],
    ['Kind of garment', kindWord(record.kind)],
    ['Date', record.date],
    ['Maker', record.maker],
    ['Label', record.label && `${record.label.transcription} (${record.label.where})`],
    ['Place', record.place],
    ['Description', record.description],
    ['Materials', record.materials.join(', ')],
    ['Techniques', record.techniques.join(', ')],
    ['Colours', record.colours.join(', ')],
    ['Fastenings', record.fastenings],
    ['Lining', record.lining],
    ['Alterations', record.alterations],
    ['Condition', record.condition],
    [
      'Hazards',
      record.hazards
        .map(
          ({ id, standing, note }) =>
            `${hazardLabels[id]}: ${standingLabels[standing]}${note && `. ${note}`}`,
        )
        .join('\n'),
    ],
    ['Handling notes (never public)', record.handling],
    ['Wearer and occasion', record.wearer],
    ['Provenance (never public)', record.provenance],
    ['References and exhibitions', record.references],
    ['Other numbers', record.otherNumbers.map(({ kind, number }) => `${kind} ${number}`).join(', ')],
    ['Store location (never public)', record.storeLocation],
    ['Credit line', record.creditLine],
  ];
  return (
    <dl className="border-t border-hair text-table">
      {rows
        .filter(([, value]) => value)
        .map(([label, value]) => (
          <div
            key={label}
            className="grid gap-x-6 border-b border-hair py-2 sm:grid-cols-[13rem_minmax(0,1fr)]"
          >
            <dt className="text-ink-3">{label}</dt>
            <dd className="max-w-text whitespace-pre-line break-words">{value}</dd>
          </div>
        ))}
    </dl>
  );
}
