import { useQueryClient } from '@tanstack/react-query';
import { useEffect, useMemo, useSyncExternalStore } from 'react';
import { findingsQuery } from '../api/findings.js';
import { sendReadings } from '../api/send-readings.js';
import { layIn, sheetQuery } from '../api/sheet.js';
import { Drafts, DraftsKept } from './drafts.js';
import { Outbox, type OutboxEntry } from './outbox.js';
import { deviceShelf, draftsKey, outboxKey } from './shelf.js';

const EVERY_MS = 30_000;

const isEntries = (value: unknown): value is readonly OutboxEntry[] =>
  Array.isArray(value) &&
  value.every((entry: unknown) => typeof entry === 'object' && entry !== null && 'reading' in entry);
const isDrafts = (value: unknown): value is DraftsKept => DraftsKept.safeParse(value).success;

const alone = (sheetId: string) => async (work: () => Promise<void>) => {
  if ('locks' in navigator) await navigator.locks.request(`ellwand-outbox-${sheetId}`, work);
  else await work();
};

/** The outbox of one sheet, sent at the start, when the network or the page comes back, and every half minute. */
export function useOutbox(sheetId: string): Outbox {
  const queries = useQueryClient();
  const outbox = useMemo(
    () =>
      new Outbox({
        shelf: deviceShelf(outboxKey(sheetId), isEntries),
        deliver: (readings) => sendReadings(sheetId, readings),
        alone: alone(sheetId),
        onKept: (results, version) => {
          const kept = results.flatMap(({ reading }) => (reading ? [reading] : []));
          layIn(queries, sheetId, kept, version);
          if (kept.length < results.length)
            void queries.invalidateQueries({ queryKey: sheetQuery(sheetId).queryKey });
          void queries.invalidateQueries({ queryKey: findingsQuery(sheetId).queryKey });
        },
      }),
    [sheetId, queries],
  );
  useEffect(() => {
    const send = () => void outbox.send();
    const reread = ({ key }: StorageEvent) => {
      if (key === outboxKey(sheetId)) outbox.reread();
    };
    send();
    const timer = setInterval(send, EVERY_MS);
    window.addEventListener('online', send);
    document.addEventListener('visibilitychange', send);
    window.addEventListener('storage', reread);
    return () => {
      clearInterval(timer);
      window.removeEventListener('online', send);
      document.removeEventListener('visibilitychange', send);
      window.removeEventListener('storage', reread);
    };
  }, [outbox, sheetId]);
  return outbox;
}

export const useOutboxView = (outbox: Outbox) => useSyncExternalStore(outbox.subscribe, outbox.snapshot);

export function useDrafts(sheetId: string): readonly [Drafts, DraftsKept] {
  const drafts = useMemo(() => new Drafts(deviceShelf(draftsKey(sheetId), isDrafts)), [sheetId]);
  return [drafts, useSyncExternalStore(drafts.subscribe, drafts.snapshot)];
}
