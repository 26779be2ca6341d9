import { z } from 'zod';
import { kindIds } from '../points/kinds.js';
import {
  levelLabels,
  notTakenReasons,
  type LevelFoundBy as Level,
  type NotTakenReason as Reason,
} from '../readings/reading.js';
import { wornSides } from '../readings/worn-side.js';
import { Day, LengthMm, line, Moment, prose, Uuid } from './common.js';
import { Duty, SheetPerson } from './hands.js';
import { ProtocolView } from './protocol.js';
import { StoredTableNote } from './table-note.js';

export const supports = ['flat', 'flat-tissue', 'on-a-figure', 'on-a-hanger'] as const;
export const supportLabels: Readonly<Record<(typeof supports)[number], string>> = {
  flat: 'Flat on the table',
  'flat-tissue': 'Flat, tissue inside',
  'on-a-figure': 'On a figure',
  'on-a-hanger': 'On a padded hanger',
};

/** How the bust, waist or hip level was found. */
export const LevelFoundBy = z.enum(Object.keys(levelLabels) as [Level, ...Level[]]);

export const sheetPurposes = ['record', 'study'] as const;
export type SheetPurpose = (typeof sheetPurposes)[number];

/** The facts of a measuring: who, when, where, on what, with which tape. */
export const SheetFacts = z
  .strictObject({
    people: z.array(SheetPerson).max(12),
    /** Why one person measured alone; empty where two did. */
    aloneBecause: prose(500).default(''),
    measuredOn: Day,
    place: line(200),
    support: z.enum(supports),
    tape: line(120),
    tapeLengthMm: LengthMm.refine((length) => Number(length) > 0, 'A tape is longer than nothing').default(
      '1500',
    ),
    /** What the tape shows where it should show nothing: taken off every reading made with it. */
    tapeZeroMm: LengthMm.default('0'),
    fasteningPair: prose(300).default(''),
    note: prose(4000).default(''),
    /** Points chosen to be read a second time, blind. */
    repeatPoints: z.array(z.string().max(60)).max(40).default([]),
    /** A study sheet shows how well readings repeat; it never speaks for the garment. */
    purpose: z.enum(sheetPurposes).default('record'),
  })
  .refine((facts) => facts.people.some((p) => p.duty === 'read'), {
    path: ['people'],
    message: 'Say who read the tape',
  })
  .refine(
    (facts) => {
      const readers = facts.people.filter((p) => p.duty === 'read').map((p) => p.userId);
      // Two who take turns both read and both hold: what counts is that somebody held for another.
      const holders = facts.people.filter((p) => p.duty === 'held').map((p) => p.userId);
      const second = holders.some((holder) => readers.some((reader) => reader !== holder));
      return second || facts.aloneBecause.trim() !== '';
    },
    { path: ['aloneBecause'], message: 'Say who held the tape, or why one person measured alone' },
  );
export type SheetFacts = z.infer<typeof SheetFacts>;
export type SheetFactsInput = z.input<typeof SheetFacts>;

export const NewSheet = z.strictObject({ id: Uuid.optional(), facts: SheetFacts });

export const NotTakenReason = z.enum(Object.keys(notTakenReasons) as [Reason, ...Reason[]]);

export const TypedUnit = z.enum(['mm', 'cm', 'in']);

/** How it was taken, where that is not how the point says. */
export const TakenMethod = z.enum(['flat-doubled']);
export const Worn = z.enum(wornSides);

/** What was read, exactly as keyed; the API works out the millimetres and refuses where they differ. */
const Taken = z.strictObject({
  state: z.literal('taken'),
  typed: z.string().trim().min(1).max(40),
  unit: TypedUnit,
  /** A long reading in whole tapes and a rest: 3 × 1500 + 742. `typed` is then the rest. */
  tapeCount: z.number().int().min(0).max(20).default(0),
  /** What the tape crossed between edges that could not be brought together, in the same unit: taken off. */
  gapTyped: z.string().trim().max(40).nullable().default(null),
  /** Said where a round was read flat from fold to fold: `typed` is then the half. */
  method: TakenMethod.nullable().default(null),
  /** How far below the waist the level lay, in the same unit. */
  depthTyped: z.string().trim().max(40).nullable().default(null),
  /** The half that was read, for points taken flat and doubled, is what `typed` holds. */
  levelFoundBy: LevelFoundBy.nullable().default(null),
});
const NotTaken = z.strictObject({ state: z.literal('not-taken'), reason: NotTakenReason });

const ReadingBase = z.strictObject({
  /** UUIDv7 made where it was keyed: sending it twice changes nothing. */
  id: Uuid,
  pointId: z.string().max(60),
  /** 1 for the first reading of a point, 2 for the second… */
  round: z.number().int().min(1).max(9),
  /** Which of a pair, as worn; null where the point is single or the side is not said. */
  worn: Worn.nullable().default(null),
  /** The reading that this one corrects, if any. Nothing is overwritten. */
  replaces: Uuid.nullable().default(null),
  note: prose(500).default(''),
  readBy: Uuid,
  /** Who held the tape's end just then; null where one person measured alone. */
  heldBy: Uuid.nullable().default(null),
  device: line(80),
  keyedAt: Moment,
});
export const NewReading = z.discriminatedUnion('state', [
  ReadingBase.extend(Taken.shape),
  ReadingBase.extend(NotTaken.shape),
]);
export type NewReading = z.infer<typeof NewReading>;
export const NewReadings = z.strictObject({ readings: z.array(NewReading).min(1).max(100) });

/** A reading as the API holds it. */
export const StoredReading = z.object({
  id: Uuid,
  pointId: z.string(),
  round: z.number().int(),
  worn: Worn.nullable(),
  state: z.enum(['taken', 'not-taken']),
  /** The whole value (tapes and rest added, halves doubled, the tape's zero taken off). */
  valueMm: LengthMm.nullable(),
  typed: z.string().nullable(),
  unit: TypedUnit.nullable(),
  tapeCount: z.number().int(),
  tapeLengthMm: LengthMm.nullable(),
  gapTyped: z.string().nullable(),
  gapMm: LengthMm.nullable(),
  method: TakenMethod.nullable(),
  depthTyped: z.string().nullable(),
  depthMm: LengthMm.nullable(),
  levelFoundBy: LevelFoundBy.nullable(),
  reason: NotTakenReason.nullable(),
  replaces: Uuid.nullable(),
  /** False once a later reading replaces it. */
  stands: z.boolean(),
  note: z.string(),
  readBy: Uuid,
  heldBy: Uuid.nullable(),
  recordedBy: Uuid,
  device: z.string(),
  keyedAt: Moment,
  receivedAt: Moment,
});
export type StoredReading = z.infer<typeof StoredReading>;

export const ReadingResults = z.object({
  sheetVersion: z.number().int(),
  results: z.array(
    z.object({
      id: Uuid,
      outcome: z.enum(['kept', 'already-kept', 'conflict', 'refused']),
      detail: z.string().optional(),
      reading: StoredReading.optional(),
      /** On `conflict`: the reading that stands at this point and round. */
      standing: StoredReading.optional(),
    }),
  ),
});

export const SheetState = z.enum(['open', 'complete']);
export const SheetSummary = z.object({
  id: Uuid,
  partId: Uuid,
  state: SheetState,
  purpose: z.enum(sheetPurposes),
  /** Whether it speaks for its part when the garment is next published. */
  speaks: z.boolean(),
  measuredOn: Day,
  pointsDone: z.number().int(),
  pointsWanted: z.number().int(),
});
export type SheetSummary = z.infer<typeof SheetSummary>;

export const FindingSeverity = z.enum(['stop', 'question', 'note']);
export const Finding = z.object({
  /** The same while the same check says the same of the same figures; an answer holds to it. */
  key: z.string(),
  checkId: z.string(),
  severity: FindingSeverity,
  sentence: z.string(),
  pointIds: z.array(z.string()),
  answer: z.object({ reason: z.string(), by: z.string(), at: Moment }).nullable(),
});
export type FindingView = z.infer<typeof Finding>;

export const DerivedView = z.object({
  id: z.string(),
  label: z.string(),
  formula: z.string(),
  /** The formula with its figures: "1400 mm − 1020 mm = 380 mm". */
  worked: z.string(),
  /** A length (it may be negative), or a plain ratio; one of the two. */
  valueMm: z.string().nullable(),
  ratio: z.string().nullable(),
  uncertaintyMm: z.string().nullable(),
  trace: z.array(
    z.object({
      pointId: z.string(),
      label: z.string(),
      valueMm: LengthMm,
      /** Read on the sheet of another part, or on a cut sheet. */
      elsewhere: z.boolean().optional(),
    }),
  ),
});
export type DerivedView = z.infer<typeof DerivedView>;

/** `GET /workroom/sheets/:id/findings` */
export const SheetFindings = z.object({ findings: z.array(Finding), derived: z.array(DerivedView) });
export type SheetFindings = z.infer<typeof SheetFindings>;

/** `POST /workroom/sheets/:id/findings/answers` */
export const FindingAnswer = z.strictObject({ key: z.string().min(1).max(200), reason: line(500) });

/** `GET /workroom/sheets/:id`: everything the table needs. */
export const Sheet = z.object({
  id: Uuid,
  version: z.number().int(),
  partId: Uuid,
  garmentId: Uuid,
  garmentVersion: z.number().int(),
  kind: z.enum(kindIds),
  protocolVersion: z.number().int(),
  /** The protocol that the sheet is taken by, whole, so that the table needs nothing else. */
  protocol: ProtocolView,
  /** The newest version there is: a sheet without readings may move to it. */
  newestProtocolVersion: z.number().int(),
  /** True for parts laid together as worn. */
  wornTogether: z.boolean(),
  state: SheetState,
  facts: z.object({
    people: z.array(z.object({ userId: Uuid, name: z.string(), duty: Duty })),
    aloneBecause: z.string(),
    measuredOn: Day,
    place: z.string(),
    support: z.enum(supports),
    tape: z.string(),
    tapeLengthMm: LengthMm,
    tapeZeroMm: LengthMm,
    fasteningPair: z.string(),
    note: z.string(),
    repeatPoints: z.array(z.string()),
    purpose: z.enum(sheetPurposes),
  }),
  garment: z.object({
    ownNumber: z.string(),
    title: z.string(),
    date: z.string(),
    maker: z.string().nullable(),
    partName: z.string(),
    partSuffix: z.string(),
    firstImageId: Uuid.nullable(),
    handling: z.string(),
    hazards: z.array(z.object({ id: z.string(), standing: z.string(), note: z.string() })),
  }),
  readings: z.array(StoredReading),
  /** What was said at the table beside readings, in the order in which it was said. */
  tableNotes: z.array(StoredTableNote),
});
export type Sheet = z.infer<typeof Sheet>;
