import { useSyncExternalStore } from 'react';
import { Link } from 'react-router-dom';
import { paths } from '../config/paths.js';
import { useOffline, useReachable } from '../offline/context.js';

/** Shown while something waits to be sent or the server is silent; else there is nothing to say. */
export function TrayLink() {
  const { outbox } = useOffline();
  const { operations } = useSyncExternalStore(outbox.subscribe, outbox.snapshot);
  const reachable = useReachable();
  if (operations.length === 0 && reachable) return null;
  const decisions = operations.filter(({ state }) => state === 'decision').length;
  const look = decisions > 0 ? 'bg-madder-tint text-madder' : 'bg-weld-tint text-weld-text';
  return (
    <Link
      to={paths.tray()}
      className={`figures inline-flex min-h-8 items-center rounded-sm px-3 text-table font-medium whitespace-nowrap ${look}`}
    >
      {operations.length > 0 ? `${operations.length} not yet sent` : 'Not connected'}
    </Link>
  );
}
