import { isEmptyCutSheet } from '@ellwand/shared/cut-sheet/keep-lengths';
import { conflict } from '../../common/refusal';
import type { Tx } from '../../common/work';
import type { PartRow } from '../../garments/part.entity';
import { bodyOf, cutSheetRow } from './cut-sheet-view';
import { CutSheetRow } from './cut-sheet.entity';

/**
 * Clears the way for taking a part away.
 * @throws Refusal 409 where somebody has described how the part is cut
 */
export async function dropEmptyCutSheet(tx: Tx, part: PartRow): Promise<void> {
  if (!isEmptyCutSheet(bodyOf(await cutSheetRow(tx, part.id))))
    throw conflict('part.cut-sheet', `${part.name} has a cut sheet and cannot be taken away.`);
  await tx.delete(CutSheetRow, { partId: part.id });
}
