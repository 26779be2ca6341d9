import { z } from 'zod';
import { kindIds } from '../points/kinds.js';
import { line, Moment, pageOf, Paging, prose, Uuid } from './common.js';
import { Image } from './image.js';
import { RecordStage } from './record-moves.js';
import { SheetSummary } from './sheet.js';

export const PartKind = z.enum(kindIds);

export const wornByValues = ['woman', 'man', 'child', 'unknown'] as const;
export const WornBy = z.enum(wornByValues);

/** Ways in which old dress can hurt whoever handles it. Suspected until a qualified person has tested it. */
export const hazardIds = [
  'arsenic',
  'lead',
  'mercury',
  'pesticide',
  'cellulose-nitrate',
  'weighted-silk',
  'asbestos',
  'mould',
  'sharp',
] as const;
export const Hazard = z.strictObject({
  id: z.enum(hazardIds),
  standing: z.enum(['suspected', 'tested-present', 'tested-absent']),
  note: prose(1000).default(''),
});

export const OtherNumber = z.strictObject({
  kind: z.enum(['former', 'loan', 'temporary']),
  number: line(60),
});

/** The terms a record may be published under. */
export const rightsStatements = {
  'http://rightsstatements.org/vocab/NoC-OKLR/1.0/': 'No copyright, other known legal restrictions',
  'http://rightsstatements.org/vocab/InC/1.0/': 'In copyright',
  'http://creativecommons.org/publicdomain/zero/1.0/': 'CC0 1.0',
  'http://creativecommons.org/licenses/by/4.0/': 'CC BY 4.0',
  'http://creativecommons.org/licenses/by-nc/4.0/': 'CC BY-NC 4.0',
} as const;
export const RightsUri = z.enum(Object.keys(rightsStatements) as [keyof typeof rightsStatements]);

/**
 * What is written about a garment, apart from its measurements and pictures. `provenance`, `handling` and
 * `storeLocation` never leave the Workroom; the projection leaves them out and a test holds it.
 */
export const GarmentRecord = z.strictObject({
  ownNumber: line(60),
  title: line(200),
  kind: z.enum([...kindIds, 'set']),
  wornBy: WornBy.default('unknown'),
  description: prose(8000).default(''),
  /** EDTF (ISO 8601-2): `1885~`, `1858/1861`, `1885~/1890~`. */
  date: z
    .string()
    .trim()
    .regex(/^[0-9~?%/.X[\]-]{4,40}$/, 'Write a year or a span, such as 1885, 1885~ (about) or 1858/1861'),
  maker: line(200).nullable().default(null),
  label: z
    .strictObject({ transcription: prose(1000), where: line(200) })
    .nullable()
    .default(null),
  place: line(200).nullable().default(null),
  materials: z.array(line(80)).max(30).default([]),
  techniques: z.array(line(80)).max(30).default([]),
  colours: z.array(line(40)).max(12).default([]),
  fastenings: prose(2000).default(''),
  lining: prose(1000).default(''),
  alterations: prose(2000).default(''),
  condition: prose(4000).default(''),
  hazards: z.array(Hazard).max(9).default([]),
  /** Whether the public page tells of the hazards: a curator's choice. */
  showHazards: z.boolean().default(false),
  handling: prose(4000).default(''),
  wearer: prose(1000).default(''),
  provenance: prose(4000).default(''),
  references: prose(4000).default(''),
  otherNumbers: z.array(OtherNumber).max(20).default([]),
  storeLocation: prose(200).default(''),
  creditLine: line(300),
  rights: RightsUri.default('http://creativecommons.org/publicdomain/zero/1.0/'),
  /** Whether the people on the measuring sheets are named in public. */
  showPeople: z.boolean().default(false),
});
export type GarmentRecord = z.infer<typeof GarmentRecord>;
export type GarmentRecordInput = z.input<typeof GarmentRecord>;

export const NewPart = z.strictObject({
  kind: PartKind,
  name: line(120),
  suffix: z
    .string()
    .trim()
    .regex(/^[.a-z0-9/-]{0,8}$/i)
    .default(''),
});
export type NewPart = z.infer<typeof NewPart>;

/** Whether two parts would have one number: capitals make no other number of it. */
export const isSameSuffix = (one: string, other: string) => one.toLowerCase() === other.toLowerCase();

/** Parts that are made together, each with a number of its own. */
const NewParts = z
  .array(NewPart)
  .min(1, 'A garment has at least one part')
  .max(12)
  .superRefine((parts, context) => {
    for (const [index, { suffix }] of parts.entries()) {
      if (!parts.slice(0, index).some((earlier) => isSameSuffix(earlier.suffix, suffix))) continue;
      context.addIssue({
        code: 'custom',
        path: [index, 'suffix'],
        message: 'Another part has this number already',
      });
    }
  });

/** `POST /workroom/garments`: the client may choose the id, so that a repeated request makes one garment. */
export const NewGarment = z.strictObject({
  id: Uuid.optional(),
  record: GarmentRecord,
  parts: NewParts,
});
export type NewGarment = z.infer<typeof NewGarment>;

export const Part = z.object({
  id: Uuid,
  garmentId: Uuid,
  suffix: z.string(),
  kind: PartKind,
  name: z.string(),
  position: z.number().int(),
  /** Not a part by itself but all of them, laid together as worn; it has no number of its own in public. */
  wornTogether: z.boolean(),
  sheets: z.array(SheetSummary),
});
export type Part = z.infer<typeof Part>;

/** The number of a part: its garment's with its suffix; all parts laid together have none but the garment's own. */
export const numberOfPart = (
  ownNumber: string,
  { suffix, wornTogether }: { readonly suffix: string; readonly wornTogether: boolean },
): string => (wornTogether ? ownNumber : `${ownNumber}${suffix}`);

/** A garment as the Workroom holds it. `version` answers `If-Match: "<version>"`. */
export const Garment = z.object({
  id: Uuid,
  version: z.number().int(),
  stage: RecordStage,
  publicNumber: z.string().nullable(),
  publishedVersion: z.number().int().nullable(),
  /** True while a version is public, whatever the draft's stage. */
  isPublic: z.boolean(),
  record: GarmentRecord,
  parts: z.array(Part),
  images: z.array(Image),
  /** The last return from review, shown until the next submit. */
  returned: z.object({ reason: z.string(), by: z.string(), at: Moment }).nullable(),
  createdAt: Moment,
  updatedAt: Moment,
});
export type Garment = z.infer<typeof Garment>;

export const GarmentSummary = z.object({
  id: Uuid,
  ownNumber: z.string(),
  title: z.string(),
  kind: z.string(),
  date: z.string(),
  stage: RecordStage,
  isPublic: z.boolean(),
  publicNumber: z.string().nullable(),
  openSheets: z.number().int(),
  pictures: z.number().int(),
  /** Id of the first picture that is ready, for the list's thumbnail. */
  firstImageId: Uuid.nullable(),
  updatedAt: Moment,
});
export type GarmentSummary = z.infer<typeof GarmentSummary>;
export const GarmentPage = pageOf(GarmentSummary);

export const GarmentQuery = Paging.extend({
  q: z.string().trim().max(200).optional(),
  stage: RecordStage.optional(),
  sort: z.enum(['updated', 'number', 'title']).default('updated'),
});
