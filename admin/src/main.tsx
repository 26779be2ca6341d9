// First of all: schemas look at this when they are made.
import './lib/plain-schemas.js';
import { StrictMode } from 'react';
import { createRoot } from 'react-dom/client';
import { RouterProvider } from 'react-router-dom';
import { keepShell } from './app/keep-shell.js';
import { Providers } from './app/providers.js';
import { makeRouter } from './app/router.js';
import { followDeviceTheme } from './app/theme.js';
import { sessionQuery } from './features/sign-in/api/session.js';
import { openOffline } from './offline/offline.js';
import { makeQueryClient } from './lib/query-client.js';
import './styles/workroom.css';

followDeviceTheme();
const root = document.getElementById('root');
if (!root) throw new Error('expected #root in the page');
// The page's own part is fetched while the device's database opens; the database comes before the first screen, so that
// what was typed yesterday is there when it appears.
const router = makeRouter();
const offline = await openOffline();
const queries = makeQueryClient(offline.reference);
void queries.prefetchQuery(sessionQuery);
if (import.meta.env.PROD) keepShell();
createRoot(root).render(
  <StrictMode>
    <Providers queries={queries} offline={offline}>
      <RouterProvider router={router} />
    </Providers>
  </StrictMode>,
);
