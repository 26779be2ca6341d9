/**
 * What is said at the measuring table beside readings: that a sitting begins or pauses, whose hands are at the garment,
 * that the cautions were read, what the label says. Append-only, each with its own id, so that a tablet without network
 * may say it again and again without saying it twice.
 */
import { z } from 'zod';
import { line, Moment, prose, Uuid } from './common.js';
import { SheetPerson } from './hands.js';

/** What is described at the table while the garment is out. */
export const describedThings = ['label', 'fastenings', 'condition', 'remark'] as const;
export const DescribedThing = z.enum(describedThings);
export const describedLabels: Readonly<Record<(typeof describedThings)[number], string>> = {
  label: 'Label',
  fastenings: 'Fastenings',
  condition: 'Condition',
  remark: 'Remark',
};

const said = {
  /** A sitting begins, or goes on after a pause. */
  begun: { about: z.literal('begun') },
  /** The garment is put away for now. */
  paused: { about: z.literal('paused'), reason: prose(500) },
  /** From now on these hands are at the garment, or one person alone, and why. */
  hands: {
    about: z.literal('hands'),
    people: z.array(SheetPerson).min(1).max(12),
    aloneBecause: prose(500).default(''),
  },
  /** Hazards and handling cautions were read before the box was opened. */
  cautions: { about: z.literal('cautions'), hazards: z.array(z.string().max(40)).max(30) },
  described: { about: z.literal('described'), thing: DescribedThing, text: prose(4000).min(1) },
  /** An answer to a finding, given where there may be no network. */
  answer: { about: z.literal('answer'), key: z.string().min(1).max(200), reason: line(500) },
} as const;

const carried = {
  /** UUIDv7 made where it was said: sending it twice changes nothing. */
  id: Uuid,
  device: line(80),
  saidAt: Moment,
};

export const NewTableNote = z.discriminatedUnion('about', [
  z.strictObject({ ...carried, ...said.begun }),
  z.strictObject({ ...carried, ...said.paused }),
  z.strictObject({ ...carried, ...said.hands }),
  z.strictObject({ ...carried, ...said.cautions }),
  z.strictObject({ ...carried, ...said.described }),
  z.strictObject({ ...carried, ...said.answer }),
]);
export type NewTableNote = z.infer<typeof NewTableNote>;

/** `POST /workroom/sheets/:id/table-notes` */
export const NewTableNotes = z.strictObject({ notes: z.array(NewTableNote).min(1).max(100) });

const kept = { ...carried, by: Uuid, byName: z.string(), receivedAt: Moment };

/** A note as the API holds it: with who was signed in and when it came in. */
export const StoredTableNote = z.discriminatedUnion('about', [
  z.object({ ...kept, ...said.begun }),
  z.object({ ...kept, ...said.paused }),
  z.object({ ...kept, ...said.hands }),
  z.object({ ...kept, ...said.cautions }),
  z.object({ ...kept, ...said.described }),
  z.object({ ...kept, ...said.answer }),
]);
export type StoredTableNote = z.infer<typeof StoredTableNote>;

export const TableNoteResults = z.object({
  sheetVersion: z.number().int(),
  results: z.array(
    z.object({
      id: Uuid,
      /** `refused`: kept nowhere, with why in a sentence; the tablet shows it. */
      outcome: z.enum(['kept', 'already-kept', 'refused']),
      detail: z.string().optional(),
      note: StoredTableNote.optional(),
    }),
  ),
});
export type TableNoteResults = z.infer<typeof TableNoteResults>;
