import { createContext, useContext, useSyncExternalStore } from 'react';
import type { Offline } from './offline.js';
import { reach } from './reach.js';

export const OfflineContext = createContext<Offline | null>(null);

/** What this device keeps and sends. */
export function useOffline(): Offline {
  const offline = useContext(OfflineContext);
  if (!offline) throw new Error('expected the device’s store around this screen, got none');
  return offline;
}

/** Whether the museum’s server answered when it was asked last. */
export function useReachable(): boolean {
  return !useSyncExternalStore(reach.subscribe, reach.isSilent);
}
