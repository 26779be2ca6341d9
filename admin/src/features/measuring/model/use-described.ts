import type { Sheet } from '@ellwand/shared/records/sheet';
import type { DescribedThing } from '@ellwand/shared/records/table-note';
import { useSyncExternalStore } from 'react';
import type { z } from 'zod';
import { useOffline } from '../../../offline/context.js';
import type { OutboxView, SheetOutbox } from './outbox.js';

export interface SaidOf {
  readonly id: string;
  readonly text: string;
  readonly byName: string;
  readonly saidAt: string;
}

type Thing = z.infer<typeof DescribedThing>;

/** What was described at the table so far: what the museum has, and what waits here. */
export function describedSoFar(
  { tableNotes }: Pick<Sheet, 'tableNotes'>,
  { notes }: Pick<OutboxView, 'notes'>,
): readonly (SaidOf & { readonly thing: Thing })[] {
  const waiting = notes.map(({ note, byName }) => ({ ...note, byName }));
  return [...tableNotes, ...waiting].flatMap((note) =>
    note.about === 'described'
      ? [{ id: note.id, thing: note.thing, text: note.text, byName: note.byName, saidAt: note.saidAt }]
      : [],
  );
}

/** One thing to describe: what was said of it, and what is being written, kept on this device as it is typed. */
export function useDescribed(sheet: Sheet, outbox: SheetOutbox, view: OutboxView, thing: Thing) {
  const { drafts } = useOffline();
  const row = `note ${thing}`;
  const all = useSyncExternalStore(drafts.subscribe, () => drafts.ofSheet(sheet.id));
  const kept = all[row];
  const draft = typeof kept === 'string' ? kept : '';
  return {
    said: describedSoFar(sheet, view).filter((one) => one.thing === thing),
    draft,
    type: (text: string) => drafts.set(sheet.id, row, text),
    keep: () => {
      void outbox.say({ about: 'described', thing, text: draft.trim() });
      drafts.clear(sheet.id, row);
    },
  };
}
