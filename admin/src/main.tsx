// First of all: schemas look at this when they are made.
import './lib/plain-schemas.js';
import { StrictMode } from 'react';
import { createRoot } from 'react-dom/client';
import { RouterProvider } from 'react-router-dom';
import { Providers } from './app/providers.js';
import { makeRouter } from './app/router.js';
import { followDeviceTheme } from './app/theme.js';
import { makeQueryClient } from './lib/query-client.js';
import './styles/workroom.css';

followDeviceTheme();
const root = document.getElementById('root');
if (!root) throw new Error('expected #root in the page');
createRoot(root).render(
  <StrictMode>
    <Providers queries={makeQueryClient()}>
      <RouterProvider router={makeRouter()} />
    </Providers>
  </StrictMode>,
);
