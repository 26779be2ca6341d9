/** Several sheets of one part over the years: what each read, which one speaks for the part, and why. */
import { z } from 'zod';
import { kindIds } from '../points/kinds.js';
import { Day, LengthMm, line, Moment, Uuid } from './common.js';
import { Duty } from './hands.js';
import { NotTakenReason, SheetState, sheetPurposes, TakenMethod, Worn } from './sheet.js';
import { DescribedThing } from './table-note.js';

/** One value of a sheet: the mean of the rounds of a point, or of one side of it. */
export const SheetValue = z.object({
  pointId: z.string(),
  worn: Worn.nullable(),
  valueMm: LengthMm,
  uncertaintyMm: LengthMm,
  rounds: z.number().int(),
  /** How many times one tape length was joined to the next. */
  tapeJoins: z.number().int(),
  /** Said where it was taken otherwise than its point says. */
  method: TakenMethod.nullable(),
});
export type SheetValue = z.infer<typeof SheetValue>;

export const SheetOfPart = z.object({
  id: Uuid,
  state: SheetState,
  purpose: z.enum(sheetPurposes),
  measuredOn: Day,
  protocolVersion: z.number().int(),
  people: z.array(z.object({ userId: Uuid, name: z.string(), duty: Duty })),
  /** The note on the sheet itself. */
  note: z.string(),
  /** What was noted of condition, or remarked, while it lay on the table. */
  remarks: z.array(
    z.object({
      id: Uuid,
      thing: DescribedThing,
      text: z.string(),
      byName: z.string(),
      saidAt: Moment,
    }),
  ),
  values: z.array(SheetValue),
  notTaken: z.array(z.object({ pointId: z.string(), worn: Worn.nullable(), reason: NotTakenReason })),
});
export type SheetOfPart = z.infer<typeof SheetOfPart>;

/** `GET /workroom/parts/:id/sheets` */
export const PartSheets = z.object({
  partId: Uuid,
  garmentId: Uuid,
  /** The garment's: answers `If-Match` where another sheet is chosen. */
  version: z.number().int(),
  ownNumber: z.string(),
  title: z.string(),
  partName: z.string(),
  partSuffix: z.string(),
  kind: z.enum(kindIds),
  wornTogether: z.boolean(),
  /** Every point that a sheet asked for, in the newest sheet's handling order, then those that only older ones asked for. */
  points: z.array(
    z.object({
      pointId: z.string(),
      label: z.string(),
      how: z.enum(['round', 'straight', 'curve', 'flat-doubled']),
    }),
  ),
  /** The sheet that speaks for the part when it is next published; null while no record sheet is complete. */
  speaking: z.object({ sheetId: Uuid }).nullable(),
  /** Who chose it, and why; null where the newest complete record sheet speaks by itself. */
  chosen: z.object({ sheetId: Uuid, because: z.string(), by: z.string(), at: Moment }).nullable(),
  /** The sheet that the public sees now, in which version; null where none is public. */
  published: z.object({ sheetId: Uuid, version: z.number().int() }).nullable(),
  /** Oldest first. */
  sheets: z.array(SheetOfPart),
});
export type PartSheets = z.infer<typeof PartSheets>;

/** `PUT /workroom/parts/:id/speaking-sheet`; null leaves it to the newest complete record sheet again. */
export const SpeakingSheet = z.strictObject({ sheetId: Uuid.nullable(), reason: line(500) });
export type SpeakingSheet = z.infer<typeof SpeakingSheet>;
