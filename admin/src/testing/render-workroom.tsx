import { render } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { createMemoryRouter, RouterProvider } from 'react-router-dom';
import { vi } from 'vitest';
import { Providers } from '../app/providers.js';
import { routes } from '../app/router.js';
import { makeQueryClient } from '../lib/query-client.js';
import { MemoryStore } from '../offline/memory-store.js';
import { startOffline } from '../offline/offline.js';
import type { OfflineStore } from '../offline/store.js';
import { fakeApi } from './fake-api/fake-api.js';
import { House } from './fake-api/house.js';

const ORIGIN = 'http://127.0.0.1:4310';

/** A request as a test may look at it or answer it otherwise. */
export type Interception = (request: Request) => Response | Promise<Response> | undefined;

interface RenderedWith {
  readonly house?: House;
  readonly intercept?: Interception;
  /** What this device keeps: hand the same one in again to load the page again. */
  readonly store?: OfflineStore;
}

/** Opens the Workroom at an address over a house in memory, with `fetch` leading there. */
export function renderWorkroom(
  path: string,
  { house = new House(), intercept, store = new MemoryStore() }: RenderedWith = {},
) {
  const answer = fakeApi(house);
  const asked: string[] = [];
  const door = { intercept };
  vi.stubGlobal('fetch', async (input: string, init?: RequestInit) => {
    // jsdom's AbortSignal is not the platform's; nothing here depends on aborting.
    const request = new Request(new URL(input, ORIGIN), { ...init, signal: null });
    asked.push(`${request.method} ${new URL(request.url).pathname.replace('/api/v1', '')}`);
    return (await door.intercept?.(request.clone())) ?? answer(request);
  });
  const offline = startOffline(store);
  const queries = makeQueryClient(offline.reference);
  queries.setDefaultOptions({ queries: { ...queries.getDefaultOptions().queries, retry: false } });
  const router = createMemoryRouter(routes, { initialEntries: [path] });
  const user = userEvent.setup();
  const screen = render(
    <Providers queries={queries} offline={offline}>
      <RouterProvider router={router} />
    </Providers>,
  );
  return { offline, store, house, user, router, queries, asked, door, ...screen };
}
