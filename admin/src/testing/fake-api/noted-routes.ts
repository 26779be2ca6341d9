import { type NotedList, NoteSettlement } from '@ellwand/shared/records/noted';
import type { House } from './house.js';
import { read, Refusal } from './refuse.js';
import { json, type Routes } from './router.js';

function notedOf(house: House, garmentId: string): NotedList {
  const items = house.sheets
    .filter((sheet) => sheet.garmentId === garmentId)
    .flatMap(({ id: sheetId, facts, garment, tableNotes }) =>
      tableNotes.flatMap((note) => {
        if (note.about !== 'described' || house.settled.has(note.id)) return [];
        const { id, thing, text, byName, saidAt } = note;
        return [
          {
            id,
            sheetId,
            thing,
            text,
            byName,
            saidAt,
            measuredOn: facts.measuredOn,
            partName: garment.partName,
          },
        ];
      }),
    );
  return { items: items.toSorted((one, other) => one.saidAt.localeCompare(other.saidAt)) };
}

export const notedRoutes: Routes = {
  'GET /workroom/garments/:id/noted-at-table': ({ house, params }) => json(notedOf(house, params.id)),
  'POST /workroom/table-notes/:id/settle': ({ house, params, body }) => {
    const sheet = house.sheets.find(({ tableNotes }) => tableNotes.some(({ id }) => id === params.id));
    if (!sheet) throw new Refusal(404, 'note.unknown', {}, 'There is no such note.');
    house.settled.set(params.id, read(NoteSettlement, body).how);
    return json(notedOf(house, sheet.garmentId));
  },
};
