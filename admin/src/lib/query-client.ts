import { QueryClient } from '@tanstack/react-query';
import { NoAnswer } from './problem-error.js';

/** A refusal will be the same the second time; only silence is worth asking again. */
export function makeQueryClient(): QueryClient {
  return new QueryClient({
    defaultOptions: {
      queries: {
        staleTime: 10_000,
        retry: (failures, error) => error instanceof NoAnswer && failures < 2,
      },
      mutations: { retry: false },
    },
  });
}
