import { useSyncExternalStore } from 'react';
import { Button } from '../components/ui/button.js';
import { useOffline } from '../offline/context.js';
import { newerWorkroom } from './newer-workroom.js';

/** Offered only while nothing waits to be sent: the new one might read the old one's tray differently. */
export function NewerNotice() {
  const take = useSyncExternalStore(newerWorkroom.subscribe, newerWorkroom.snapshot);
  const { outbox } = useOffline();
  const { operations } = useSyncExternalStore(outbox.subscribe, outbox.snapshot);
  if (!take || operations.length > 0) return null;
  return (
    <p
      role="status"
      className="flex flex-wrap items-center gap-3 border-b border-hair bg-indigo-tint px-4 py-2 text-table"
    >
      A newer Workroom is ready.
      <Button height="dense" onClick={take}>
        Use it now
      </Button>
    </p>
  );
}
