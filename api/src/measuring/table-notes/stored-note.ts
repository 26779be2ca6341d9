import { StoredTableNote } from '@ellwand/shared/records/table-note';
import { In } from 'typeorm';
import type { Tx } from '../../common/work';
import { UserRow } from '../../users/user.entity';
import { TableNoteRow } from './table-note.entity';

/** Everything said at a sheet's table, in the order in which it was said, whenever it came in. */
export async function tableNotesOf(tx: Tx, sheetId: string): Promise<StoredTableNote[]> {
  const rows = await tx.find(TableNoteRow, { where: { sheetId }, order: { saidAt: 'ASC', id: 'ASC' } });
  return toStoredNotes(tx, rows);
}

export async function toStoredNotes(tx: Tx, rows: readonly TableNoteRow[]): Promise<StoredTableNote[]> {
  if (rows.length === 0) return [];
  const users = await tx.find(UserRow, { where: { id: In([...new Set(rows.map((row) => row.saidBy))]) } });
  const names = new Map(users.map((user) => [user.id, user.name]));
  return rows.map((row) =>
    StoredTableNote.parse({
      ...row.body,
      id: row.id,
      about: row.about,
      device: row.device,
      saidAt: row.saidAt.toISOString(),
      by: row.saidBy,
      byName: names.get(row.saidBy) ?? '',
      receivedAt: row.receivedAt.toISOString(),
    }),
  );
}
