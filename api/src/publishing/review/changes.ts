import { levelLabels, notTakenReasons } from '@ellwand/shared/readings/reading';
import { wornSideLabels } from '@ellwand/shared/readings/worn-side';
import type {
  PublishedDocument,
  PublishedMeasurement,
  PublishedPart,
} from '@ellwand/shared/records/published-garment';
import type { Change } from '@ellwand/shared/records/publishing';
import { cutSheetFields } from './cut-sheet-changes';

/** The record's public fields in the order in which they are told, each with its name and how its value reads. */
const fields: readonly { label: string; read: (document: PublishedDocument) => string | null }[] = [
  { label: 'Number', read: (d) => d.ownNumber },
  { label: 'Title', read: (d) => d.title },
  { label: 'Kind', read: (d) => d.kind },
  { label: 'Worn by', read: (d) => d.wornBy },
  { label: 'Date', read: (d) => d.date.display },
  { label: 'Description', read: (d) => d.description },
  { label: 'Maker', read: (d) => d.maker },
  { label: 'Label', read: (d) => d.label && `${d.label.transcription} (${d.label.where})` },
  { label: 'Place', read: (d) => d.place },
  { label: 'Materials', read: (d) => d.materials.join(', ') },
  { label: 'Techniques', read: (d) => d.techniques.join(', ') },
  { label: 'Colours', read: (d) => d.colours.join(', ') },
  { label: 'Fastenings', read: (d) => d.fastenings },
  { label: 'Lining', read: (d) => d.lining },
  { label: 'Alterations', read: (d) => d.alterations },
  { label: 'Condition', read: (d) => d.condition },
  { label: 'Hazards', read: (d) => d.hazards.map((h) => `${h.id}, ${h.standing}: ${h.note}`).join('; ') },
  { label: 'Wearer', read: (d) => d.wearer },
  { label: 'References', read: (d) => d.references },
  { label: 'Other numbers', read: (d) => d.otherNumbers.map((n) => `${n.number} (${n.kind})`).join(', ') },
  { label: 'Credit line', read: (d) => d.creditLine },
  { label: 'Rights', read: (d) => d.rights.label },
];

/** What the public will see differently: field by field, measurement by measurement, picture by picture. */
export function changesBetween(before: PublishedDocument | null, after: PublishedDocument): Change[] {
  return [
    ...fields.flatMap(({ label, read }) =>
      change('record', label, before ? read(before) : null, read(after)),
    ),
    ...compare('record', partFactsOf(before), partFactsOf(after)),
    ...compare('measurement', measurementsOf(before), measurementsOf(after)),
    ...compare('cut-sheet', cutSheetsOf(before), cutSheetsOf(after)),
    ...compare('picture', picturesOf(before), picturesOf(after)),
  ];
}

interface Entry {
  readonly label: string;
  readonly text: string;
}

function change(area: Change['area'], label: string, was: string | null, is: string | null): Change[] {
  const before = was?.trim() ? was : null;
  const after = is?.trim() ? is : null;
  if (before === after) return [];
  const kind = before === null ? 'added' : after === null ? 'removed' : 'changed';
  return [{ kind, area, label, before, after }];
}

function compare(
  area: Change['area'],
  before: ReadonlyMap<string, Entry>,
  after: ReadonlyMap<string, Entry>,
): Change[] {
  const keys = new Set([...before.keys(), ...after.keys()]);
  return [...keys].flatMap((key) => {
    const was = before.get(key);
    const is = after.get(key);
    return change(area, is?.label ?? was?.label ?? key, was?.text ?? null, is?.text ?? null);
  });
}

/** All parts laid together as worn have the garment's own number, which one of its parts may have too. */
const placeOf = ({ number, wornTogether }: PublishedPart) => (wornTogether ? `${number} as worn` : number);

/** What is said of how each part was measured, and by whom where the record names them. */
function partFactsOf(document: PublishedDocument | null): Map<string, Entry> {
  const facts = (part: PublishedPart): [string, string | null][] => [
    ['Part', `${part.number}, ${part.name}`],
    ['Measured on', part.measuredOn],
    ['Measured by', [...part.measuredBy, `${part.peopleCount} in all`].join(', ')],
    ['Support', part.support],
    ['Tape', part.tape],
    ['Fastening pair', part.fasteningPair],
  ];
  return new Map(
    (document?.parts ?? []).flatMap((part) =>
      facts(part).map(([label, text]) => [
        `${placeOf(part)} ${label}`,
        { label: `${label} (${part.name})`, text: text ?? '' },
      ]),
    ),
  );
}

function measurementsOf(document: PublishedDocument | null): Map<string, Entry> {
  const parts = document?.parts ?? [];
  return new Map(parts.flatMap((part) => [...taken(part), ...notTaken(part)]));
}

function taken(part: PublishedPart): [string, Entry][] {
  return part.measurements.map((m) => [
    keyOf(part, m),
    { label: `${sided(m)} (${part.name})`, text: readingText(m) },
  ]);
}

function notTaken(part: PublishedPart): [string, Entry][] {
  return part.notTaken.map((n) => [
    keyOf(part, n),
    { label: `${sided(n)} (${part.name})`, text: `Not taken. ${notTakenReasons[n.reason]}` },
  ]);
}

/** The same point of the same side, also beside a version from before sides were told apart. */
function keyOf(part: PublishedPart, { pointId, worn }: Sided): string {
  return `${placeOf(part)} ${pointId}${worn ? ` ${worn}` : ''}`;
}

type Sided = Pick<PublishedMeasurement, 'pointId' | 'label' | 'worn'>;

const sided = ({ label, worn }: Sided) => (worn ? `${label}, ${wornSideLabels[worn]}` : label);

/** To the last place that is kept: a change of a sixteenth of an inch is a change. */
function readingText(measurement: PublishedMeasurement): string {
  const { valueMm, uncertaintyMm, rounds, levelFoundBy, method, gapMm, depthMm } = measurement;
  return [
    `${valueMm} mm ± ${uncertaintyMm} mm`,
    method && 'flat, doubled',
    levelFoundBy && levelLabels[levelFoundBy],
    depthMm && `${depthMm} mm below the waist`,
    gapMm && `gap of ${gapMm} mm taken off`,
    rounds > 1 && `${rounds} rounds`,
  ]
    .filter(Boolean)
    .join(', ');
}

function cutSheetsOf(document: PublishedDocument | null): Map<string, Entry> {
  const said = (document?.parts ?? []).flatMap(cutSheetFields);
  return new Map(said.map(({ key, label, text }) => [key, { label, text }]));
}

function picturesOf(document: PublishedDocument | null): Map<string, Entry> {
  const images = document?.images ?? [];
  return new Map(
    images.map((image, index) => [
      image.id,
      {
        label: `Picture, ${image.view}`,
        text: [`${index + 1}.`, image.alt, image.caption, image.credit].filter(Boolean).join(' '),
      },
    ]),
  );
}
