import type { PublishedCutSheet } from '../records/cut-sheet.js';
import type { CutTable } from './cut-table.js';
import { bonesTable, fullnessTable, patternTable, seamsTable } from './making-tables.js';
import { dartsTable, neckTable, panelsTable, piecesTable } from './shape-tables.js';

/**
 * A published cut sheet as tables, those that have a row, in the order of the sheet. Pages paint them and the list of
 * changes reads them, so that neither can leave out what the other has.
 */
export function cutTables(sheet: PublishedCutSheet): readonly CutTable[] {
  return [
    piecesTable(sheet),
    panelsTable(sheet),
    dartsTable(sheet),
    neckTable(sheet),
    fullnessTable(sheet),
    bonesTable(sheet),
    seamsTable(sheet),
    patternTable(sheet),
  ].filter(({ rows }) => rows.length > 0);
}
