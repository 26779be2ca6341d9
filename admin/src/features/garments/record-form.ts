import {
  type GarmentRecord as Rec,
  GarmentRecord,
  hazardIds,
  OtherNumber,
} from '@ellwand/shared/records/garment';
import { z } from 'zod';
import type { HazardId } from '@ellwand/shared/records/hazard-words';

const HazardTyped = z.object({ standing: z.string(), note: z.string() });

/** The record as it is typed: strings in boxes, lists one to a line, "nothing said" an empty box. */
const Typed = z.object({
  ownNumber: z.string(),
  title: z.string(),
  kind: z.string(),
  wornBy: z.string(),
  description: z.string(),
  date: z.string(),
  maker: z.string(),
  label: z.object({ transcription: z.string(), where: z.string() }),
  place: z.string(),
  materials: z.string(),
  techniques: z.string(),
  colours: z.string(),
  fastenings: z.string(),
  lining: z.string(),
  alterations: z.string(),
  condition: z.string(),
  hazards: z.object(
    Object.fromEntries(hazardIds.map((id) => [id, HazardTyped])) as Record<HazardId, typeof HazardTyped>,
  ),
  showHazards: z.boolean(),
  handling: z.string(),
  wearer: z.string(),
  provenance: z.string(),
  references: z.string(),
  otherNumbers: z.array(z.object({ kind: z.string(), number: z.string() })),
  storeLocation: z.string(),
  creditLine: z.string(),
  rights: z.string(),
  showPeople: z.boolean(),
});
export type RecordTyped = z.infer<typeof Typed>;

const listed = (text: string): string[] =>
  text
    .split('\n')
    .map((entry) => entry.trim())
    .filter((entry) => entry !== '');

const orNull = (text: string): string | null => (text.trim() === '' ? null : text);

function toRecord(typed: RecordTyped): unknown {
  const { transcription, where } = typed.label;
  return {
    ...typed,
    maker: orNull(typed.maker),
    place: orNull(typed.place),
    label: transcription.trim() === '' && where.trim() === '' ? null : typed.label,
    materials: listed(typed.materials),
    techniques: listed(typed.techniques),
    colours: listed(typed.colours),
    hazards: hazardIds
      .filter((id) => typed.hazards[id].standing !== '')
      .map((id) => ({ id, ...typed.hazards[id] })),
    otherNumbers: typed.otherNumbers.filter(({ number }) => number.trim() !== ''),
  };
}

/** The form's schema ends in the API's own: what passes here passes there. */
export const RecordForm = Typed.transform(toRecord).pipe(GarmentRecord);

/** A stored record laid out in the form's boxes. */
export function typedRecord(record: Rec): RecordTyped {
  const hazards = Object.fromEntries(
    hazardIds.map((id) => {
      const found = record.hazards.find((hazard) => hazard.id === id);
      return [id, { standing: found?.standing ?? '', note: found?.note ?? '' }];
    }),
  ) as RecordTyped['hazards'];
  return {
    ...record,
    maker: record.maker ?? '',
    place: record.place ?? '',
    label: record.label ?? { transcription: '', where: '' },
    materials: record.materials.join('\n'),
    techniques: record.techniques.join('\n'),
    colours: record.colours.join('\n'),
    hazards,
    otherNumbers: record.otherNumbers.map((number) => OtherNumber.parse(number)),
  };
}

export const emptyRecord = (creditLine = ''): RecordTyped =>
  typedRecord({
    ...GarmentRecord.parse({ ownNumber: '-', title: '-', kind: 'dress', date: '1900', creditLine: '-' }),
    ownNumber: '',
    title: '',
    date: '',
    creditLine,
  });

/** Names of the form's boxes, for sentences about them: "Title", "Public description". */
export const boxLabels: Readonly<Record<keyof RecordTyped, string>> = {
  ownNumber: 'Own number',
  title: 'Title',
  kind: 'Kind of garment',
  wornBy: 'Made for',
  description: 'Public description',
  date: 'Date',
  maker: 'Maker',
  label: 'Maker’s label',
  place: 'Place',
  materials: 'Materials',
  techniques: 'Techniques',
  colours: 'Colours',
  fastenings: 'Fastenings',
  lining: 'Lining',
  alterations: 'Alterations',
  condition: 'Condition',
  hazards: 'Hazards',
  showHazards: 'Tell the public of the hazards',
  handling: 'Handling notes',
  wearer: 'Wearer and occasion',
  provenance: 'Provenance',
  references: 'References and exhibitions',
  otherNumbers: 'Other numbers',
  storeLocation: 'Store location',
  creditLine: 'Credit line',
  rights: 'Rights statement',
  showPeople: 'Name the people who measured',
};
