import type { Sheet } from '@ellwand/shared/records/sheet';
import { useQuery } from '@tanstack/react-query';
import { useSession } from '../../../lib/session.js';
import { colleaguesQuery } from '../api/colleagues.js';
import { type Hands, handsNow, holderOf, readerOf } from './hands.js';
import type { OutboxView, SheetOutbox } from './outbox.js';

/** Who reads the tape and who holds it just now, and the way to say that others take over. */
export function useHands(sheet: Sheet, outbox: SheetOutbox, { notes }: OutboxView) {
  const { user } = useSession();
  const colleagues = useQuery(colleaguesQuery);
  const said = [...sheet.tableNotes, ...notes.map(({ note }) => note)];
  const hands = handsNow(sheet.facts, said);
  const names = new Map([
    ...(colleagues.data ?? []).map(({ id, name }) => [id, name] as const),
    ...sheet.facts.people.map(({ userId, name }) => [userId, name] as const),
    [user.id, user.name] as const,
  ]);
  return {
    now: hands,
    readBy: readerOf(hands) ?? user.id,
    heldBy: holderOf(hands),
    nameOf: (userId: string) => names.get(userId) ?? 'Somebody',
    change: (next: Hands) =>
      void outbox.say({ about: 'hands', people: next.people, aloneBecause: next.aloneBecause }),
  };
}
