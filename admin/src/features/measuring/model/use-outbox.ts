import { useMemo, useSyncExternalStore } from 'react';
import { useSession } from '../../../lib/session.js';
import { useOffline } from '../../../offline/context.js';
import { type DraftsKept, SheetDrafts } from './drafts.js';
import { SheetOutbox } from './outbox.js';

/** What of this sheet waits on this device, and the way to add to it. */
export function useOutbox(sheetId: string): SheetOutbox {
  const { outbox, drafts } = useOffline();
  const { user } = useSession();
  const { id, name } = user;
  return useMemo(
    () => new SheetOutbox(outbox, drafts, sheetId, { id, name }),
    [outbox, drafts, sheetId, id, name],
  );
}

export const useOutboxView = (outbox: SheetOutbox) => useSyncExternalStore(outbox.subscribe, outbox.snapshot);

export function useDrafts(sheetId: string): readonly [SheetDrafts, DraftsKept] {
  const { drafts } = useOffline();
  const own = useMemo(() => new SheetDrafts(drafts, sheetId), [drafts, sheetId]);
  return [own, useSyncExternalStore(own.subscribe, own.snapshot)];
}
