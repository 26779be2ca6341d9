/** Cut sheets for specs: what is not said is not known. */
import { keptCutSheet } from '../cut-sheet/keep-lengths.js';
import { type CutSheetBody, NewCutSheet, type NewCutSheetInput } from '../records/cut-sheet.js';

const inMm = (typed: string) => ({ typed, unit: 'mm' as const });

type Piece = NewCutSheetInput['pieces'][number];
interface PieceSketch extends Omit<Partial<Piece>, 'widths'> {
  /** In millimetres, by level; what is left out was not read. */
  readonly widths?: Partial<Record<'bust' | 'waist' | 'hip' | 'hem', string>>;
}

export function piece(name: string, { widths = {}, ...more }: PieceSketch = {}): Piece {
  const read = Object.fromEntries(Object.entries(widths).map(([level, typed]) => [level, inMm(typed)]));
  return { key: name.toLowerCase().replaceAll(/[^a-z0-9]+/g, '-'), name, count: 1, ...more, widths: read };
}

export function typedCutSheet(more: Partial<NewCutSheetInput> = {}): NewCutSheetInput {
  return {
    pieces: [],
    darts: [],
    neck: {},
    underarm: {},
    fullness: [],
    bones: [],
    seams: [],
    ...more,
  };
}

export function cutSheet(more: Partial<NewCutSheetInput> = {}): CutSheetBody {
  return keptCutSheet(NewCutSheet.parse(typedCutSheet(more)));
}
