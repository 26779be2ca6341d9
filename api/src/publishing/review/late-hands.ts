import type { Tx } from '../../common/work';
import { GarmentEditor } from '../../garments/garment-editor.entity';
import type { Involved } from './approval';

/**
 * A tablet may tell of hands at the table only after the record was frozen: whoever is known now to have had a hand in it
 * counts as well.
 */
export async function withLateHands(tx: Tx, garmentId: string, snapshot: Involved): Promise<Involved> {
  const editors = await tx.find(GarmentEditor, { where: { garmentId } });
  return { ...snapshot, editedBy: [...snapshot.editedBy, ...editors.map(({ userId }) => userId)] };
}
