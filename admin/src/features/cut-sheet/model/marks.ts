import type { MarkPair, PixelMark } from '@ellwand/shared/cut-sheet/pattern-scale';
import {
  drawnScale,
  patternScale,
  readPair,
  type PatternScale,
} from '@ellwand/shared/cut-sheet/pattern-scale';
import { straightUncertaintyMm } from '@ellwand/shared/cut-sheet/straight-reading';
import { shownUncertainty } from '@ellwand/shared/readings/uncertainty';
import { formatLength, type LengthUnit } from '@ellwand/shared/units/format-length';
import { type Length, toMmString } from '@ellwand/shared/units/length';
import { fromTyped } from '@ellwand/shared/units/parse-length';
import type { TypedMark, TypedSheet } from './typed-sheet.js';

type Pattern = TypedSheet['pattern'];

/** Where a mark is kept in the form. */
export type MarkName = `marks.${'from' | 'to'}` | `pairs.${number}.${'from' | 'to'}`;

export interface NamedMark {
  readonly name: MarkName;
  /** What stands beside it in the picture: A and B give the scale, 1a and 1b are the first pair. */
  readonly letter: string;
  /** Null while it is not set, or its boxes hold no whole number. */
  readonly at: PixelMark | null;
}

export function pixelMark({ x, y }: TypedMark): PixelMark | null {
  return /^\d{1,6}$/.test(x.trim()) && /^\d{1,6}$/.test(y.trim()) ? { x: Number(x), y: Number(y) } : null;
}

/** Every mark of the pattern in the order in which they are set. */
export function namedMarks({ marks, pairs }: Pattern): readonly NamedMark[] {
  return [
    { name: 'marks.from', letter: 'A', at: pixelMark(marks.from) },
    { name: 'marks.to', letter: 'B', at: pixelMark(marks.to) },
    ...pairs.flatMap(({ from, to }, index): NamedMark[] => [
      { name: `pairs.${index}.from`, letter: `${index + 1}a`, at: pixelMark(from) },
      { name: `pairs.${index}.to`, letter: `${index + 1}b`, at: pixelMark(to) },
    ]),
  ];
}

/** The next mark that is not set yet, after this one; this one where all are. */
export function nextMark(marks: readonly NamedMark[], after: MarkName): MarkName {
  const place = marks.findIndex(({ name }) => name === after);
  const turned = [...marks.slice(place + 1), ...marks.slice(0, place)];
  return turned.find(({ at }) => at === null)?.name ?? after;
}

/** A mark moved by some pixels, kept within the picture. */
export function nudged({ x, y }: PixelMark, across: number, down: number, size: PixelMark): PixelMark {
  const within = (value: number, most: number) => Math.min(Math.max(value, 0), most);
  return { x: within(x + across, size.x), y: within(y + down, size.y) };
}

function pairOf(from: TypedMark, to: TypedMark): MarkPair | null {
  const [one, other] = [pixelMark(from), pixelMark(to)];
  return one && other ? { from: one, to: other } : null;
}

function lengthOf(text: string, unit: LengthUnit): Length | null {
  const read = fromTyped({ text, unit });
  return read.ok ? read.value.length : null;
}

/** The scale as it is typed; nothing while a mark or the distance is missing. */
export function scaleWhileTyping({ marks, distance }: Pattern, unit: LengthUnit): PatternScale | undefined {
  const pair = pairOf(marks.from, marks.to);
  const known = lengthOf(distance, unit);
  if (!pair || known === null) return undefined;
  const own = straightUncertaintyMm({ typed: distance, unit, mm: toMmString(known) });
  return patternScale(pair, known, own);
}

/** "1:4", from the distance on the garment and on the paper. */
export function drawnWhileTyping({ distance, onPaper }: Pattern, unit: LengthUnit): string | undefined {
  const [garment, paper] = [lengthOf(distance, unit), lengthOf(onPaper, unit)];
  return garment !== null && paper !== null ? drawnScale(garment, paper) : undefined;
}

/** "312 mm ± 1.2 mm" for a pair of marks; nothing while there is no scale or a mark is missing. */
export function pairReading(
  scale: PatternScale | undefined,
  from: TypedMark,
  to: TypedMark,
  stepPx: number,
): string | undefined {
  const pair = pairOf(from, to);
  if (!scale || !pair) return undefined;
  const { length, uncertaintyMm } = readPair(scale, pair, stepPx);
  return `${formatLength(length, 'mm', { places: 1 })} ± ${toMmString(shownUncertainty(uncertaintyMm))} mm`;
}
