import { type PanelNote, panelNotes } from '@ellwand/shared/cut-sheet/panel-notes';
import type { PanelledSheet } from '@ellwand/shared/cut-sheet/panel-sum';
import { panelLevels } from '@ellwand/shared/cut-sheet/words';
import type { RoundRead } from '@ellwand/shared/records/cut-sheet';
import { mm, toMmString } from '@ellwand/shared/units/length';
import { fromTyped } from '@ellwand/shared/units/parse-length';
import type { TypedSheet } from './typed-sheet.js';

type Typed = Pick<TypedSheet, 'unit' | 'pieces'>;

/** What the panels say as they are typed: a box that cannot be read counts as not read. */
export function notesWhileTyping(sheet: Typed, rounds: readonly RoundRead[]): readonly PanelNote[] {
  return panelNotes(
    panelled(sheet),
    rounds.map(({ level, label, valueMm }) => ({ level, label, value: mm(valueMm) })),
  );
}

function panelled({ unit, pieces }: Typed): PanelledSheet {
  return {
    pieces: pieces.map(({ name, count, layer, widths }, index) => ({
      name: name.trim() || `Piece ${index + 1}`,
      count: countOf(count),
      layer,
      widths: {
        bust: widthOf(widths[panelLevels[0]], unit),
        waist: widthOf(widths[panelLevels[1]], unit),
        hip: widthOf(widths[panelLevels[2]], unit),
        hem: widthOf(widths[panelLevels[3]], unit),
      },
    })),
  };
}

function countOf(text: string): number {
  const count = Number(text.trim());
  return Number.isInteger(count) && count >= 1 && count <= 40 ? count : 0;
}

function widthOf(text: string, unit: Typed['unit']) {
  const read = fromTyped({ text, unit });
  return read.ok ? { typed: text, unit: read.value.unit, mm: toMmString(read.value.length) } : null;
}
