import { type CutSheetBody, type KeptLength, NewCutSheet } from '@ellwand/shared/records/cut-sheet';
import type {
  dartCentres,
  edgeFinishes,
  fullnessKinds,
  grains,
  PanelLevel,
  pieceLayers,
  pleatDirections,
  stitchings,
  tipSides,
} from '@ellwand/shared/cut-sheet/words';
import type { LengthUnit } from '@ellwand/shared/units/format-length';
import { z } from 'zod';

/** A mark as it stands in its two boxes. */
export interface TypedMark {
  x: string;
  y: string;
}

export interface TypedPair {
  key: string;
  name: string;
  from: TypedMark;
  to: TypedMark;
}

/** The cut sheet as it is typed: every length and number as text, "nothing said" an empty box. */
export interface TypedSheet {
  unit: LengthUnit;
  pieces: {
    key: string;
    name: string;
    count: string;
    onFold: boolean;
    grain: (typeof grains)[number];
    layer: (typeof pieceLayers)[number];
    widths: Record<PanelLevel, string>;
    note: string;
  }[];
  darts: {
    key: string;
    piece: string;
    where: string;
    count: string;
    fromCentre: string;
    centre: (typeof dartCentres)[number];
    tip: string;
    tipSide: (typeof tipSides)[number];
    length: string;
    intake: string;
  }[];
  neck: { frontWidth: string; frontDepth: string; backWidth: string; backDepth: string };
  underarm: { belowNeckPoint: string; aboveWaist: string };
  fullness: {
    key: string;
    where: string;
    kind: (typeof fullnessKinds)[number];
    count: string;
    depth: string;
    direction: (typeof pleatDirections)[number];
    stitchedDown: string;
    note: string;
  }[];
  bones: {
    key: string;
    where: string;
    count: string;
    length: string;
    material: string;
    position: string;
  }[];
  seams: {
    key: string;
    where: string;
    allowance: string;
    stitching: (typeof stitchings)[number];
    stitchesPer10Mm: string;
    edge: (typeof edgeFinishes)[number];
    note: string;
  }[];
  note: string;
  innerNote: string;
  pattern: {
    imageId: string;
    marks: { from: TypedMark; to: TypedMark };
    distance: string;
    onPaper: string;
    pairs: TypedPair[];
  };
}

/** Whether a text names its unit: "24 3/8 in", "61 cm". */
const namesUnit = (text: string) => /[a-z"″”]/i.test(text);

const mapValues = <T extends Record<string, string>>(values: T, change: (text: string) => string): T =>
  Object.fromEntries(Object.entries(values).map(([name, text]) => [name, change(text)])) as T;

/** The sheet with every box for a length changed, and nothing else. */
function mapLengths(sheet: TypedSheet, change: (text: string) => string): TypedSheet {
  return {
    ...sheet,
    pieces: sheet.pieces.map((piece) => ({ ...piece, widths: mapValues(piece.widths, change) })),
    darts: sheet.darts.map(({ fromCentre, tip, length, intake, ...dart }) => ({
      ...dart,
      ...mapValues({ fromCentre, tip, length, intake }, change),
    })),
    neck: mapValues(sheet.neck, change),
    underarm: mapValues(sheet.underarm, change),
    fullness: sheet.fullness.map(({ depth, stitchedDown, ...row }) => ({
      ...row,
      ...mapValues({ depth, stitchedDown }, change),
    })),
    bones: sheet.bones.map(({ length, ...row }) => ({ ...row, ...mapValues({ length }, change) })),
    seams: sheet.seams.map(({ allowance, ...row }) => ({ ...row, ...mapValues({ allowance }, change) })),
    pattern: {
      ...sheet.pattern,
      ...mapValues({ distance: sheet.pattern.distance, onPaper: sheet.pattern.onPaper }, change),
    },
  };
}

/**
 * The sheet for figures that are typed in another unit from now on. What stands in the boxes keeps its meaning: a bare
 * 612 that was typed in millimetres becomes "612 mm", and nothing is converted.
 */
export function inUnit(sheet: TypedSheet, unit: LengthUnit): TypedSheet {
  const spell = (text: string) =>
    text.trim() === '' || namesUnit(text) ? text : `${text.trim()} ${sheet.unit}`;
  return { ...(unit === sheet.unit ? sheet : mapLengths(sheet, spell)), unit };
}

/** A kept sheet laid out in the form's boxes, every length as it was typed. */
export function typedSheet(body: CutSheetBody): TypedSheet {
  const said = (length: KeptLength | null): string =>
    length === null
      ? ''
      : length.unit === body.unit || namesUnit(length.typed)
        ? length.typed
        : `${length.typed} ${length.unit}`;
  const each = <T extends Record<string, KeptLength | null>>(lengths: T) =>
    Object.fromEntries(Object.entries(lengths).map(([name, length]) => [name, said(length)])) as Record<
      keyof T,
      string
    >;
  const { unit, note, innerNote } = body;
  return {
    ...{ unit, note, innerNote },
    pieces: body.pieces.map(({ count, widths, ...piece }) => ({
      ...piece,
      count: String(count),
      widths: each(widths),
    })),
    darts: body.darts.map(({ piece, count, fromCentre, tip, length, intake, ...dart }) => ({
      ...dart,
      piece: piece ?? '',
      count: String(count),
      ...each({ fromCentre, tip, length, intake }),
    })),
    neck: each(body.neck),
    underarm: each(body.underarm),
    fullness: body.fullness.map(({ count, depth, stitchedDown, ...row }) => ({
      ...row,
      count: count === null ? '' : String(count),
      ...each({ depth, stitchedDown }),
    })),
    bones: body.bones.map(({ count, length, ...row }) => ({
      ...row,
      count: String(count),
      length: said(length),
    })),
    seams: body.seams.map(({ allowance, stitchesPer10Mm, ...row }) => ({
      ...row,
      allowance: said(allowance),
      stitchesPer10Mm: stitchesPer10Mm ?? '',
    })),
    pattern: typedPattern(body.pattern, said),
  };
}

export const noMark: TypedMark = { x: '', y: '' };

function typedPattern(
  pattern: CutSheetBody['pattern'],
  said: (length: KeptLength | null) => string,
): TypedSheet['pattern'] {
  if (!pattern)
    return { imageId: '', marks: { from: noMark, to: noMark }, distance: '', onPaper: '', pairs: [] };
  const mark = ({ x, y }: { x: number; y: number }) => ({ x: String(x), y: String(y) });
  return {
    imageId: pattern.imageId,
    marks: { from: mark(pattern.marks.from), to: mark(pattern.marks.to) },
    distance: said(pattern.distance),
    onPaper: said(pattern.onPaper),
    pairs: pattern.pairs.map(({ key, name, from, to }) => ({ key, name, from: mark(from), to: mark(to) })),
  };
}

/** A whole number as typed; text that is none is left for the schema to refuse in words. */
export const wholeNumber = (text: string): number | null => (text.trim() === '' ? null : Number(text.trim()));

const orNull = (text: string): string | null => (text.trim() === '' ? null : text);

function toSheet(typed: TypedSheet): unknown {
  const length = (text: string) => (text.trim() === '' ? null : { typed: text, unit: typed.unit });
  const each = (lengths: Readonly<Record<string, string>>) =>
    Object.fromEntries(Object.entries(lengths).map(([name, text]) => [name, length(text)]));
  const mark = ({ x, y }: TypedMark) => ({ x: wholeNumber(x), y: wholeNumber(y) });
  const { pattern } = typed;
  return {
    ...typed,
    pieces: typed.pieces.map((piece) => ({
      ...piece,
      count: wholeNumber(piece.count),
      widths: each(piece.widths),
    })),
    darts: typed.darts.map(({ fromCentre, tip, length: long, intake, ...dart }) => ({
      ...dart,
      piece: orNull(dart.piece),
      count: wholeNumber(dart.count),
      ...each({ fromCentre, tip, length: long, intake }),
    })),
    neck: each(typed.neck),
    underarm: each(typed.underarm),
    fullness: typed.fullness.map(({ depth, stitchedDown, ...row }) => ({
      ...row,
      count: wholeNumber(row.count),
      ...each({ depth, stitchedDown }),
    })),
    bones: typed.bones.map((row) => ({ ...row, count: wholeNumber(row.count), length: length(row.length) })),
    seams: typed.seams.map((row) => ({
      ...row,
      allowance: length(row.allowance),
      stitchesPer10Mm: orNull(row.stitchesPer10Mm),
    })),
    pattern:
      pattern.imageId === ''
        ? null
        : {
            imageId: pattern.imageId,
            marks: { from: mark(pattern.marks.from), to: mark(pattern.marks.to) },
            distance: length(pattern.distance),
            onPaper: length(pattern.onPaper),
            pairs: pattern.pairs.map(({ from, to, ...pair }) => ({
              ...pair,
              from: mark(from),
              to: mark(to),
            })),
          },
  };
}

/** The form's schema ends in the API's own: what passes here passes there. */
export const CutSheetForm = z.custom<TypedSheet>().transform(toSheet).pipe(NewCutSheet);
