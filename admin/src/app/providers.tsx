import { QueryClientProvider, type QueryClient } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { OfflineContext } from '../offline/context.js';
import type { Offline } from '../offline/offline.js';

interface Provided {
  readonly queries: QueryClient;
  readonly offline: Offline;
  readonly children: ReactNode;
}

export function Providers({ queries, offline, children }: Provided) {
  return (
    <OfflineContext value={offline}>
      <QueryClientProvider client={queries}>{children}</QueryClientProvider>
    </OfflineContext>
  );
}
