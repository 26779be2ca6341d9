import { NewReading, StoredReading } from '@ellwand/shared/records/sheet';
import { NewTableNote } from '@ellwand/shared/records/table-note';
import { ImageView } from '@ellwand/shared/records/image';
import { Day, Uuid } from '@ellwand/shared/records/common';
import { z } from 'zod';

/** A picture taken at the table; its bytes lie beside, under the operation's id. */
export const TablePicture = z.object({
  id: Uuid,
  garmentId: Uuid,
  view: ImageView,
  pointId: z.string().nullable(),
  takenOn: Day,
  fileName: z.string(),
});
export type TablePicture = z.infer<typeof TablePicture>;

const carried = {
  /** UUIDv7 made where it was keyed: the idempotency key. */
  id: Uuid,
  sheetId: Uuid,
  /** Who was signed in: it is sent in nobody else's name. */
  by: Uuid,
  byName: z.string(),
  /** `decision`: the API refused it or has another; a person must say what becomes of it. */
  state: z.enum(['waiting', 'decision']),
  why: z.string().optional(),
  /** The reading that stands at this point and round instead. */
  standing: StoredReading.optional(),
};

/** One thing said or read at the table, on its way to the API. Never changed by anybody but a person's decision. */
export const Operation = z.discriminatedUnion('kind', [
  z.object({ ...carried, kind: z.literal('reading'), reading: NewReading }),
  z.object({ ...carried, kind: z.literal('note'), note: NewTableNote }),
  z.object({ ...carried, kind: z.literal('picture'), picture: TablePicture }),
]);
export type Operation = z.infer<typeof Operation>;
export type OperationOf<Kind extends Operation['kind']> = Extract<Operation, { kind: Kind }>;

/** An operation in its place: the order in which things were keyed on this device. */
export interface Placed {
  readonly place: number;
  readonly operation: Operation;
}
