import { createBrowserRouter, Navigate, type RouteObject } from 'react-router-dom';

import { BuildingLayout } from './BuildingLayout.tsx';
import { CrashPage } from './CrashPage.tsx';
import { NotFoundPage } from './NotFoundPage.tsx';
import { paths } from './paths.ts';
import { RequireSession } from './RequireSession.tsx';

/** Pages of a building load when they are first opened. */
export const routeObjects: RouteObject[] = [
  {
    errorElement: <CrashPage />,
    // while the first page loads: the bare ground
    hydrateFallbackElement: <></>,
    children: [
      {
        path: paths.signIn,
        lazy: async () => ({ Component: (await import('../features/sign-in/SignInPage.tsx')).SignInPage }),
      },
      {
        element: <RequireSession />,
        children: [
          { index: true, element: <Navigate to={paths.buildings} replace /> },
          {
            path: paths.buildings,
            lazy: async () => ({ Component: (await import('../features/buildings/BuildingsPage.tsx')).BuildingsPage }),
          },
          {
            path: '/buildings/:buildingId',
            element: <BuildingLayout />,
            children: [
              { index: true, element: <Navigate to="inputs/levels" replace /> },
              { path: 'inputs', element: <Navigate to="levels" replace /> },
              {
                path: 'inputs/:tab',
                lazy: async () => ({ Component: (await import('../features/inputs/InputsPage.tsx')).InputsPage }),
              },
              {
                path: 'distribution',
                lazy: async () => ({
                  Component: (await import('../features/distribution/DistributionPage.tsx')).DistributionPage,
                }),
              },
              {
                path: 'takedown',
                lazy: async () => ({ Component: (await import('../features/takedown/TakedownPage.tsx')).TakedownPage }),
              },
              {
                path: 'schedule',
                lazy: async () => ({ Component: (await import('../features/schedule/SchedulePage.tsx')).SchedulePage }),
              },
            ],
          },
          { path: '*', element: <NotFoundPage /> },
        ],
      },
    ],
  },
];

export const makeRouter = () => createBrowserRouter(routeObjects);
