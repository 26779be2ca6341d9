import { QueryClient } from '@tanstack/react-query';
import { MemoryStore } from '../offline/memory-store.js';
import { Reference } from '../offline/reference.js';
import { NoAnswer } from './problem-error.js';

const references = new WeakMap<QueryClient, Reference>();

/**
 * A refusal will be the same the second time; only silence is worth asking again. The browser's guess at whether there
 * is a network is left aside: whoever asks finds out.
 */
export function makeQueryClient(reference: Reference = new Reference(new MemoryStore())): QueryClient {
  const queries = new QueryClient({
    defaultOptions: {
      queries: {
        staleTime: 10_000,
        networkMode: 'always',
        retry: (failures, error) => error instanceof NoAnswer && failures < 2,
      },
      mutations: { retry: false, networkMode: 'always' },
    },
  });
  references.set(queries, reference);
  return queries;
}

/** What this device kept of earlier answers, for queries that can do without a network. */
export function referenceOf(queries: QueryClient): Reference {
  const found = references.get(queries);
  if (!found) throw new Error('expected a query client made by makeQueryClient');
  return found;
}
