import { createBrowserRouter, type RouteObject } from 'react-router-dom';
import { Door } from './door.js';
import { Shell } from './shell.js';
import { Astray, Broken, Opening } from './astray.js';

/** The floor plan. What the table does not need at once is fetched when it is opened. */
export const routes: RouteObject[] = [
  {
    errorElement: <Broken />,
    hydrateFallbackElement: <Opening />,
    children: [
      {
        path: '/sign-in',
        lazy: async () => ({
          Component: (await import('../features/sign-in/components/sign-in-page.js')).SignInPage,
        }),
      },
      {
        path: '/invitation',
        lazy: async () => ({
          Component: (await import('../features/sign-in/components/invitation-page.js')).InvitationPage,
        }),
      },
      {
        path: '/first-administrator',
        lazy: async () => ({
          Component: (await import('../features/sign-in/components/first-administrator-page.js'))
            .FirstAdministratorPage,
        }),
      },
      {
        element: <Door />,
        children: [
          {
            element: <Shell />,
            children: [
              {
                index: true,
                lazy: async () => ({
                  Component: (await import('../features/garments/components/garment-list-page.js'))
                    .GarmentListPage,
                }),
              },
              {
                path: '/garments/new',
                lazy: async () => ({
                  Component: (await import('../features/garments/components/new-garment-page.js'))
                    .NewGarmentPage,
                }),
              },
              {
                path: '/garments/:garmentId',
                lazy: async () => ({ Component: (await import('./routes/garment-page.js')).GarmentPage }),
              },
              {
                path: '/garments/:garmentId/parts/:partId/sheets/new',
                lazy: async () => ({
                  Component: (await import('../features/measuring/components/new-sheet-page.js'))
                    .NewSheetPage,
                }),
              },
              {
                path: '/garments/:garmentId/parts/:partId/sheets',
                lazy: async () => ({
                  Component: (await import('./routes/part-sheets-page.js')).PartSheetsPage,
                }),
              },
              {
                path: '/garments/:garmentId/parts/:partId/cut-sheet',
                lazy: async () => ({
                  Component: (await import('./routes/cut-sheet-page.js')).CutSheetPage,
                }),
              },
              {
                path: '/review',
                lazy: async () => ({ Component: (await import('./routes/review-page.js')).ReviewPage }),
              },
              {
                path: '/garments/:garmentId/review',
                lazy: async () => ({ Component: (await import('./routes/review-page.js')).ReviewPage }),
              },
              {
                path: '/protocols',
                lazy: async () => ({
                  Component: (await import('../features/protocols/components/protocol-list-page.js'))
                    .ProtocolListPage,
                }),
              },
              {
                path: '/protocols/:kind',
                lazy: async () => ({
                  Component: (await import('../features/protocols/components/protocol-page.js')).ProtocolPage,
                }),
              },
              {
                path: '/tray',
                lazy: async () => ({
                  Component: (await import('../features/tray/components/tray-page.js')).TrayPage,
                }),
              },
              {
                path: '/repeatability',
                lazy: async () => ({
                  Component: (await import('../features/repeatability/components/repeatability-page.js'))
                    .RepeatabilityPage,
                }),
              },
              {
                path: '/people',
                lazy: async () => ({
                  Component: (await import('../features/people/components/people-page.js')).PeoplePage,
                }),
              },
              {
                path: '/audit',
                lazy: async () => ({
                  Component: (await import('../features/audit/components/audit-page.js')).AuditPage,
                }),
              },
              { path: '*', element: <Astray /> },
            ],
          },
          {
            path: '/sheets/:sheetId',
            lazy: async () => ({
              Component: (await import('../features/measuring/components/sheet-page.js')).SheetPage,
            }),
          },
        ],
      },
    ],
  },
];

export const makeRouter = () => createBrowserRouter(routes, { basename: '/workroom' });
