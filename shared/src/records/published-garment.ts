import { z } from 'zod';
import { kindIds } from '../points/kinds.js';
import { Day, LengthMm, Moment, pageOf, Uuid } from './common.js';
import { PublishedCutSheet } from './cut-sheet.js';
import { ImageView } from './image.js';
import { OwnPointView } from './protocol.js';
import { VersionState } from './record-moves.js';
import { DerivedView, LevelFoundBy, NotTakenReason, TakenMethod, Worn } from './sheet.js';

/** One measurement as the public reads it: the number, and everything needed to trust it. */
export const PublishedMeasurement = z.object({
  pointId: z.string(),
  label: z.string(),
  /** Which of a pair, as worn: a point read on both sides has two measurements, the one that speaks for it first. */
  worn: Worn.nullable().default(null),
  valueMm: LengthMm,
  uncertaintyMm: LengthMm,
  /** How many rounds stand behind the mean, and how far apart they lay. */
  rounds: z.number().int(),
  spreadMm: LengthMm,
  levelFoundBy: LevelFoundBy.nullable(),
  /** Whole tapes and a rest, where the reading was made so. */
  tapeLengths: z.object({ count: z.number().int(), tapeMm: LengthMm, restMm: LengthMm }).nullable(),
  /** The half that was read, where it was taken flat and doubled. */
  halfMm: LengthMm.nullable(),
  /** Said where it was taken otherwise than its point says. */
  method: TakenMethod.nullable().default(null),
  /** What the tape crossed between edges that could not be brought together: taken off. */
  gapMm: LengthMm.nullable().default(null),
  /** How far below the waist the level lay. */
  depthMm: LengthMm.nullable().default(null),
  /** A picture of the tape lying at this point. */
  imageId: Uuid.nullable(),
});
export type PublishedMeasurement = z.infer<typeof PublishedMeasurement>;

export const PublishedPart = z.object({
  /** The part's own number, `LH.1966.30.1`. */
  number: z.string(),
  kind: z.enum(kindIds),
  name: z.string(),
  /** Not a part by itself but all of them, laid together as worn: its number is the garment's own. */
  wornTogether: z.boolean().default(false),
  measuredOn: Day.nullable(),
  support: z.string().nullable(),
  tape: z.string().nullable(),
  fasteningPair: z.string().nullable(),
  /** Names only where the record says that people are shown; else empty. */
  measuredBy: z.array(z.string()),
  peopleCount: z.number().int(),
  measurements: z.array(PublishedMeasurement),
  notTaken: z.array(
    z.object({
      pointId: z.string(),
      label: z.string(),
      /** Which of a pair, as worn, where only one of the two could not be taken or each has its own reason. */
      worn: Worn.nullable().default(null),
      reason: NotTakenReason,
    }),
  ),
  derived: z.array(DerivedView),
  /** The protocol that it was measured by, in handling order; null where the document is from before it was kept. */
  protocol: z
    .object({ version: z.number().int(), pointIds: z.array(z.string()) })
    .nullable()
    .default(null),
  /** Points that the museum made for itself, for labels, definitions and lines on the diagram. */
  ownPoints: z.array(OwnPointView).default([]),
  /** How it is cut; nothing where nobody has said, and in documents from before cut sheets. */
  cutSheet: PublishedCutSheet.nullable().default(null),
});
export type PublishedPart = z.infer<typeof PublishedPart>;

export const PublishedImage = z.object({
  id: Uuid,
  view: ImageView,
  alt: z.string(),
  caption: z.string(),
  credit: z.string(),
  widthPx: z.number().int(),
  heightPx: z.number().int(),
  /** Forms exist at `/media/<id>/<width>.avif` and `.jpg` for each of these. */
  widths: z.array(z.number().int()),
});
export type PublishedImage = z.infer<typeof PublishedImage>;

/** The approved, numbered copy of a garment that the public sees: frozen when published. */
export const PublishedDocument = z.object({
  number: z.string(),
  version: z.number().int(),
  ownNumber: z.string(),
  title: z.string(),
  kind: z.enum([...kindIds, 'set']),
  wornBy: z.string(),
  description: z.string(),
  date: z.object({
    edtf: z.string(),
    display: z.string(),
    fromYear: z.number().int(),
    toYear: z.number().int(),
  }),
  maker: z.string().nullable(),
  label: z.object({ transcription: z.string(), where: z.string() }).nullable(),
  place: z.string().nullable(),
  materials: z.array(z.string()),
  techniques: z.array(z.string()),
  colours: z.array(z.string()),
  fastenings: z.string(),
  lining: z.string(),
  alterations: z.string(),
  condition: z.string(),
  hazards: z.array(z.object({ id: z.string(), standing: z.string(), note: z.string() })),
  wearer: z.string(),
  references: z.string(),
  otherNumbers: z.array(z.object({ kind: z.string(), number: z.string() })),
  creditLine: z.string(),
  rights: z.object({ uri: z.string(), label: z.string() }),
  parts: z.array(PublishedPart),
  images: z.array(PublishedImage),
  museum: z.string(),
  publishedAt: Moment,
});
export type PublishedDocument = z.infer<typeof PublishedDocument>;

/** `GET /catalogue/garments/:number`: the current document and its versions. */
export const PublishedGarment = PublishedDocument.extend({
  state: VersionState,
  versions: z.array(z.object({ version: z.number().int(), publishedAt: Moment, state: VersionState })),
});
export type PublishedGarment = z.infer<typeof PublishedGarment>;

/** The body of a 410. */
export const WithdrawalNotice = z.object({ number: z.string(), notice: z.string(), withdrawnOn: Day });
export type WithdrawalNotice = z.infer<typeof WithdrawalNotice>;

export const CatalogueCard = z.object({
  number: z.string(),
  title: z.string(),
  kind: z.string(),
  dateDisplay: z.string(),
  image: PublishedImage.nullable(),
  /** Three that say most for the kind, searched points first. */
  measurements: z.array(
    z.object({ pointId: z.string(), label: z.string(), partName: z.string(), valueMm: LengthMm }),
  ),
});
export type CatalogueCard = z.infer<typeof CatalogueCard>;

export const Facet = z.object({
  name: z.string(),
  label: z.string(),
  values: z.array(z.object({ value: z.string(), label: z.string(), count: z.number().int() })),
});
export const MeasuredRange = z.object({
  /** A measuring point's id or a group's; where both are meant, the group. */
  point: z.string(),
  label: z.string(),
  minMm: LengthMm.nullable(),
  maxMm: LengthMm.nullable(),
  /** How many of the garments that pass all else lack this measurement. */
  missing: z.number().int(),
  bins: z.array(z.object({ fromMm: LengthMm, toMm: LengthMm, count: z.number().int() })),
});
export const SearchAnswer = pageOf(CatalogueCard).extend({
  facets: z.array(Facet),
  ranges: z.array(MeasuredRange),
  /** When nothing was found: the one filter whose removal gives most. */
  advice: z.object({ sentence: z.string(), query: z.string() }).nullable(),
});
export type SearchAnswer = z.infer<typeof SearchAnswer>;
