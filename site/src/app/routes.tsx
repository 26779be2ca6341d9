import type { SiteCatalogue } from '@ellwand/shared/records/site-catalogue';
import type { LoaderFunctionArgs, RouteObject } from 'react-router-dom';
import { garmentLoader } from '../features/garment/garment-loader';
import { homeLoader } from '../features/home/home-loader';
import { searchLoader } from '../features/search/search-loader';
import { Frame } from './frame';
import { RouteProblem } from './route-problem';

/**
 * The pages and their addresses. Pages come in parts of their own, so that a first view loads no more than it
 * shows; loaders ask the catalogue that is handed in, in process on the server and over HTTP in the browser.
 */
export function siteRoutes(catalogue: SiteCatalogue): RouteObject[] {
  return [
    {
      id: 'frame',
      path: '/',
      Component: Frame,
      children: [
        {
          id: 'pages',
          ErrorBoundary: RouteProblem,
          children: [
            {
              id: 'home',
              index: true,
              loader: () => homeLoader(catalogue),
              lazy: () => import('../features/home/home-route'),
            },
            {
              id: 'search',
              path: 'search',
              loader: ({ request }: LoaderFunctionArgs) => searchLoader(catalogue, request),
              lazy: () => import('../features/search/search-route'),
            },
            {
              id: 'garment',
              path: 'g/:number',
              loader: ({ params, request }: LoaderFunctionArgs) => garmentLoader(catalogue, params, request),
              lazy: () => import('../features/garment/garment-route'),
            },
            {
              id: 'garment-version',
              path: 'g/:number/v/:version',
              loader: ({ params, request }: LoaderFunctionArgs) => garmentLoader(catalogue, params, request),
              lazy: () => import('../features/garment/garment-route'),
            },
            {
              id: 'how-we-measure',
              path: 'how-we-measure',
              lazy: () => import('../features/how-we-measure/index-route'),
            },
            {
              id: 'point',
              path: 'how-we-measure/:pointId',
              lazy: () => import('../features/how-we-measure/point-route'),
            },
            { id: 'nothing-here', path: '*', lazy: () => import('../features/notices/not-found-route') },
          ],
        },
      ],
    },
  ];
}
