import type { Sheet } from '@ellwand/shared/records/sheet';
import type { NewTableNote, StoredTableNote } from '@ellwand/shared/records/table-note';

export interface Hands {
  readonly people: Extract<NewTableNote, { about: 'hands' }>['people'];
  readonly aloneBecause: string;
}

/** Whose hands are at the garment just now: as it was said last at the table, else as the sheet's facts say. */
export function handsNow(facts: Sheet['facts'], notes: readonly (StoredTableNote | NewTableNote)[]): Hands {
  const said = notes
    .filter((note) => note.about === 'hands')
    .toSorted((one, other) => one.saidAt.localeCompare(other.saidAt));
  const last = said.at(-1);
  if (last) return { people: last.people, aloneBecause: last.aloneBecause };
  return {
    people: facts.people.map(({ userId, duty }) => ({ userId, duty })),
    aloneBecause: facts.aloneBecause,
  };
}

/** Who reads the tape; nobody where it was never said. */
export const readerOf = ({ people }: Hands): string | null =>
  people.find(({ duty }) => duty === 'read')?.userId ?? null;

/** Who holds its other end; nobody where one person measures alone. */
export function holderOf(hands: Hands): string | null {
  const reader = readerOf(hands);
  return hands.people.find(({ duty, userId }) => duty === 'held' && userId !== reader)?.userId ?? null;
}
