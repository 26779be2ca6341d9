import './styles/site.css';
import { hydrateRoot } from 'react-dom/client';
import { createBrowserRouter, matchRoutes, RouterProvider } from 'react-router-dom';
import type { Hydration } from './app/document';
import { siteRoutes } from './app/routes';
import { beginTakingOver } from './components/diagram/hydration';
import { httpCatalogue } from './lib/http-catalogue';

/** Takes the page over once everything in it has arrived: until then its links and forms work by themselves. */
async function takeOver(): Promise<void> {
  const root = document.getElementById('root');
  const data = document.getElementById('hydration')?.textContent;
  if (!root || !data) return;
  const { loaderData } = JSON.parse(data) as Hydration;
  const routes = siteRoutes(httpCatalogue);
  // What the server drew must be at hand before the first render here, or the two would differ.
  await Promise.all(
    (matchRoutes(routes, location) ?? []).map(async ({ route }) => {
      if (typeof route.lazy !== 'function') return;
      Object.assign(route, { ...(await route.lazy()), lazy: undefined });
    }),
  );
  const router = createBrowserRouter(routes, { hydrationData: { loaderData } });
  beginTakingOver();
  hydrateRoot(root, <RouterProvider router={router} />);
}

if (document.readyState === 'complete') void takeOver();
else window.addEventListener('load', () => void takeOver(), { once: true });
