/**
 * The sum of a part's panels at one level. Panels are read one by one by the same hand with the same tape, so their
 * errors may all go the same way: eight panels each 1 mm over are 8 mm over. Their uncertainties are therefore added
 * and not combined by squares.
 */
import { fromMmString, sumOf, times, type Length } from '../units/length.js';
import { type LengthKept, straightUncertaintyMm } from './straight-reading.js';
import type { PanelLevel, PieceLayer } from './words.js';

export interface PanelPiece {
  readonly name: string;
  readonly count: number;
  readonly layer: PieceLayer;
  readonly widths: Readonly<Record<PanelLevel, LengthKept | null>>;
}

/** What of a cut sheet the sums need. */
export interface PanelledSheet {
  readonly pieces: readonly PanelPiece[];
}

export interface PanelWidth {
  readonly name: string;
  readonly width: Length;
  /** Standard uncertainty of this one panel in mm. */
  readonly uncertaintyMm: number;
}

export interface PanelSum {
  readonly level: PanelLevel;
  readonly panels: number;
  readonly sum: Length;
  /** Standard uncertainty in mm: one panel's after the other, added. */
  readonly uncertaintyMm: number;
  /** Panels that were read elsewhere but not at this level: while there are any, the sum says nothing. */
  readonly missing: readonly string[];
}

/** Which pieces go round the body: those of one layer that have a width anywhere. */
function panelsOf({ pieces }: PanelledSheet, layers: readonly PieceLayer[]): readonly PanelPiece[] {
  return pieces.filter(
    ({ layer, widths }) => layers.includes(layer) && Object.values(widths).some((width) => width !== null),
  );
}

/** The outside goes round; a part whose outside was not measured is told by its lining. */
function roundPanels(sheet: PanelledSheet, level: PanelLevel): readonly PanelPiece[] {
  const outside = panelsOf(sheet, ['outside', 'outside-and-lining']);
  const lining = panelsOf(sheet, ['lining', 'outside-and-lining']);
  return outside.some(({ widths }) => widths[level] !== null) ? outside : lining;
}

function widthsOf({ name, count, widths }: PanelPiece, level: PanelLevel): readonly PanelWidth[] {
  const width = widths[level];
  if (width === null) return [];
  const uncertaintyMm = straightUncertaintyMm(width);
  return Array.from({ length: count }, () => ({ name, width: fromMmString(width.mm), uncertaintyMm }));
}

/** Every panel's width at a level, a piece that was cut twice twice; empty where none was read. */
export function panelWidths(sheet: PanelledSheet, level: PanelLevel): readonly PanelWidth[] {
  return roundPanels(sheet, level).flatMap((piece) => widthsOf(piece, level));
}

/** The sum at a level; undefined where no panel was read there. */
export function panelSum(sheet: PanelledSheet, level: PanelLevel): PanelSum | undefined {
  const widths = panelWidths(sheet, level);
  if (widths.length === 0) return undefined;
  return {
    level,
    panels: widths.length,
    sum: sumOf(widths.map(({ width }) => width)),
    uncertaintyMm: widths.reduce((total, { uncertaintyMm }) => total + uncertaintyMm, 0),
    missing: roundPanels(sheet, level)
      .filter((piece) => piece.widths[level] === null)
      .map(({ name }) => name),
  };
}

/** What panels may differ from a round by, apart from the round's own tolerance: a millimetre each. */
export function allowedByPanels(panels: number, each: Length): Length {
  return times(each, panels);
}
