/**
 * The cut sheet of a part: pieces, panel widths, darts, pleats, bones, seams, and a hand-drawn pattern at known scale.
 * One shape in three states: as it is sent (`typed` and `unit`), as it is kept (with the exact millimetres that the
 * API worked out) and as the public reads it (millimetres alone). An empty length is null and not zero: a gore that
 * comes to nothing at the waist is 0, one that nobody measured there is null.
 */
import { z } from 'zod';
import {
  dartCentres,
  edgeFinishes,
  fullnessKinds,
  grains,
  panelLevels,
  pieceLayers,
  pleatDirections,
  stitchings,
  tipSides,
} from '../cut-sheet/words.js';
import { fromTyped, lengthProblemSentence } from '../units/parse-length.js';
import { LengthMm, line, Moment, prose, Uuid } from './common.js';
import { TypedUnit } from './sheet.js';

/** A length as somebody typed it; `unit` is what a bare figure means. */
export const TypedLength = z
  .strictObject({ typed: z.string().trim().min(1).max(40), unit: TypedUnit })
  .superRefine(({ typed, unit }, context) => {
    const read = fromTyped({ text: typed, unit });
    if (!read.ok) context.addIssue({ code: 'custom', message: lengthProblemSentence(read.problem) });
  });
export type TypedLength = z.infer<typeof TypedLength>;

/** The same with its exact millimetres. `unit` is then the unit that was meant, also where it was typed out. */
export const KeptLength = z.object({ typed: z.string(), unit: TypedUnit, mm: LengthMm });
export type KeptLength = z.infer<typeof KeptLength>;

/** Tells the rows of one cut sheet apart; made where the row is added. */
const RowKey = z.string().regex(/^[a-z0-9-]{1,40}$/, 'A key of small letters, digits and hyphens');

const wholeNumber = (most: number) =>
  z
    .number({ error: 'Write a whole number, such as 2' })
    .int('Write a whole number, such as 2')
    .min(1, 'At least 1')
    .max(most, `At most ${most}`);

/** A place in a picture, in pixels of the original from its upper left corner. */
export const Mark = z.strictObject({
  x: z.number({ error: 'Set this mark' }).int('Whole pixels').min(0).max(100_000),
  y: z.number({ error: 'Set this mark' }).int('Whole pixels').min(0).max(100_000),
});
export type Mark = z.infer<typeof Mark>;

/** The fields of a cut sheet over one form of length; `said` is that form or null. */
function cutSheetFields<Said extends z.ZodType>(said: Said) {
  const row = { key: RowKey };
  const [bust, waist, hip, hem] = panelLevels;
  return {
    pieces: z
      .array(
        z.strictObject({
          ...row,
          name: line(80),
          count: wholeNumber(40),
          onFold: z.boolean().default(false),
          grain: z.enum(grains).default('not-known'),
          layer: z.enum(pieceLayers).default('outside'),
          /** Seam to seam as the piece lies finished, pleats closed; each piece by itself. */
          widths: z.strictObject({ [bust]: said, [waist]: said, [hip]: said, [hem]: said }),
          note: prose(500).default(''),
        }),
      )
      .max(60),
    darts: z
      .array(
        z.strictObject({
          ...row,
          /** Key of the piece it is in; null where no piece of the list is meant. */
          piece: RowKey.nullable().default(null),
          where: prose(120).default(''),
          count: wholeNumber(20),
          /** From the centre line to the foot of the dart, along the waist. */
          fromCentre: said,
          centre: z.enum(dartCentres).default('front'),
          /** How far the tip lies above or below the waist. */
          tip: said,
          tipSide: z.enum(tipSides).default('above'),
          length: said,
          /** What it takes up where it is widest. */
          intake: said,
        }),
      )
      .max(40),
    neck: z.strictObject({ frontWidth: said, frontDepth: said, backWidth: said, backDepth: said }),
    underarm: z.strictObject({ belowNeckPoint: said, aboveWaist: said }),
    fullness: z
      .array(
        z.strictObject({
          ...row,
          where: line(120),
          kind: z.enum(fullnessKinds),
          /** How many pleats, or rows of gathering or gauging. */
          count: wholeNumber(999).nullable().default(null),
          depth: said,
          direction: z.enum(pleatDirections).default('not-said'),
          /** How far down from its upper edge it is stitched. */
          stitchedDown: said,
          note: prose(500).default(''),
        }),
      )
      .max(40),
    bones: z
      .array(
        z.strictObject({
          ...row,
          /** The seam or channel. */
          where: line(120),
          count: wholeNumber(80),
          length: said,
          /** As seen; empty where it is not known. */
          material: prose(80).default(''),
          position: prose(200).default(''),
        }),
      )
      .max(60),
    seams: z
      .array(
        z.strictObject({
          ...row,
          where: line(120),
          allowance: said,
          stitching: z.enum(stitchings).default('not-known'),
          /** Stitches counted on 10 mm, as written: "5", "4.5". */
          stitchesPer10Mm: z
            .string()
            .trim()
            .regex(/^\d{1,2}([.,]\d)?$/, 'Write how many stitches there are on 10 mm, such as 5 or 4.5')
            .nullable()
            .default(null),
          edge: z.enum(edgeFinishes).default('not-known'),
          note: prose(500).default(''),
        }),
      )
      .max(60),
    /** For makers and for the public. */
    note: prose(2000).default(''),
  };
}

/** A hand-drawn pattern as a picture: two marks a known distance apart give its scale, further pairs are read by it. */
function patternFields<Said extends z.ZodType>(said: Said) {
  return {
    imageId: Uuid,
    marks: z.strictObject({ from: Mark, to: Mark }),
    /** How far the two marks lie apart on the garment. */
    distance: said,
    /** How far they lie apart on the paper, which gives the scale it was drawn to. */
    onPaper: said,
    pairs: z.array(z.strictObject({ key: RowKey, name: line(80), from: Mark, to: Mark })).max(60),
  };
}

function refuseLooseEnds(
  sheet: {
    readonly pieces: readonly { readonly key: string }[];
    readonly darts: readonly { readonly piece: string | null }[];
  },
  context: z.core.$RefinementCtx,
): void {
  const issue = (path: (string | number)[], message: string) =>
    context.addIssue({ code: 'custom', path, message });
  for (const [list, rows] of Object.entries(sheet)) {
    if (!Array.isArray(rows)) continue;
    const keys = (rows as readonly { readonly key: string }[]).map(({ key }) => key);
    for (const [index, key] of keys.entries())
      if (keys.indexOf(key) !== index) issue([list, index, 'key'], 'Another row has this key already');
  }
  for (const [index, { piece }] of sheet.darts.entries())
    if (piece !== null && !sheet.pieces.some(({ key }) => key === piece))
      issue(['darts', index, 'piece'], 'Choose one of the pieces above');
}

const typed = TypedLength.nullable().default(null);
const kept = KeptLength.nullable().default(null);
const read = LengthMm.nullable().default(null);

const own = {
  /** What a bare figure in a box means. */
  unit: TypedUnit.default('mm'),
  /** Never public. */
  innerNote: prose(4000).default(''),
};

/** `PUT /workroom/parts/:id/cut-sheet` with `If-Match`, `"0"` for the first. */
export const NewCutSheet = z
  .strictObject({
    ...own,
    ...cutSheetFields(typed),
    pattern: z.strictObject(patternFields(typed)).nullable().default(null),
  })
  .superRefine(refuseLooseEnds);
export type NewCutSheet = z.output<typeof NewCutSheet>;
export type NewCutSheetInput = z.input<typeof NewCutSheet>;

/** A cut sheet as it is kept. */
export const CutSheetBody = z.strictObject({
  ...own,
  ...cutSheetFields(kept),
  pattern: z.strictObject(patternFields(kept)).nullable().default(null),
});
export type CutSheetBody = z.output<typeof CutSheetBody>;

/** A round that was read on the part's measuring sheet, to hold the panels' sum against. */
export const RoundRead = z.object({
  level: z.enum(panelLevels),
  /** The measuring point's name: "Waistband". */
  label: z.string(),
  valueMm: LengthMm,
});
export type RoundRead = z.infer<typeof RoundRead>;

/** `GET /workroom/parts/:id/cut-sheet`: an empty one at version 0 where nobody has written any. */
export const CutSheet = z.object({
  partId: Uuid,
  version: z.number().int(),
  body: CutSheetBody,
  rounds: z.array(RoundRead),
  updatedAt: Moment.nullable(),
  updatedBy: z.string().nullable(),
});
export type CutSheet = z.output<typeof CutSheet>;

/** A sum of panels as the public reads it, beside the round that was read. */
export const PublishedPanelSum = z.object({
  level: z.enum(panelLevels),
  panels: z.number().int(),
  sumMm: LengthMm,
  uncertaintyMm: LengthMm,
  read: z.object({ label: z.string(), valueMm: LengthMm }).nullable(),
});

/** What the public reads of a cut sheet: no inner note, and the pattern only where its picture is public. */
export const PublishedCutSheet = z.object({
  ...cutSheetFields(read),
  sums: z.array(PublishedPanelSum),
  pattern: z
    .object({
      imageId: Uuid,
      distanceMm: LengthMm,
      /** "1:4", where it is known. */
      drawnTo: z.string().nullable(),
      pairs: z.array(z.object({ name: z.string(), valueMm: LengthMm, uncertaintyMm: LengthMm })),
    })
    .nullable(),
});
export type PublishedCutSheet = z.output<typeof PublishedCutSheet>;
