import { QueryClientProvider, type QueryClient } from '@tanstack/react-query';
import type { ReactNode } from 'react';

export function Providers({
  queries,
  children,
}: {
  readonly queries: QueryClient;
  readonly children: ReactNode;
}) {
  return <QueryClientProvider client={queries}>{children}</QueryClientProvider>;
}
