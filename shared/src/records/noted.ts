/** What was described at the table while a garment was out, until somebody lays it into the record or sets it aside. */
import { z } from 'zod';
import { Day, Moment, Uuid } from './common.js';
import { DescribedThing } from './table-note.js';

export const NotedAtTable = z.object({
  id: Uuid,
  sheetId: Uuid,
  measuredOn: Day,
  partName: z.string(),
  thing: DescribedThing,
  text: z.string(),
  byName: z.string(),
  saidAt: Moment,
});
export type NotedAtTable = z.infer<typeof NotedAtTable>;

/** `GET /workroom/garments/:id/noted-at-table`: what waits, oldest first. */
export const NotedList = z.object({ items: z.array(NotedAtTable) });
export type NotedList = z.infer<typeof NotedList>;

/** What became of a note: its words are in the record now, or they do not belong there. */
export const settlements = ['laid-in', 'set-aside'] as const;
export type Settlement = (typeof settlements)[number];

/** `POST /workroom/table-notes/:id/settle` */
export const NoteSettlement = z.strictObject({ how: z.enum(settlements) });

/** `GET` and `PUT /workroom/settings/damage-reports`: who is told of damage seen at the table; nobody named means every curator. */
export const DamageReports = z.strictObject({ userIds: z.array(Uuid).max(50) });
export type DamageReports = z.infer<typeof DamageReports>;
