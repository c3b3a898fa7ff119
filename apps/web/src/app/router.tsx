import { createBrowserRouter } from 'react-router-dom';
import type { RouteObject } from 'react-router-dom';
import { PageLoading } from '../components/loading-state';
import { NotFound } from './not-found';
import { PageError } from './page-error';

/** What a feature's routes.tsx exports: pages behind the sign-in, and pages for everyone. */
interface FeatureRoutes {
  routes?: RouteObject[];
  publicRoutes?: RouteObject[];
}

const features = Object.values(import.meta.glob<FeatureRoutes>('../features/*/routes.tsx', { eager: true }));

/** Pages that need no sign-in. */
export const publicTree: RouteObject[] = features.flatMap((feature) => feature.publicRoutes ?? []);

/** All pages. Each feature lists its own; their code comes when they are opened. */
export const routeTree: RouteObject[] = [
  {
    ErrorBoundary: PageError,
    HydrateFallback: PageLoading,
    children: [
      ...publicTree,
      {
        lazy: () => import('./shell/signed-in'),
        children: [
          {
            ErrorBoundary: PageError,
            children: [
              ...features.flatMap((feature) => feature.routes ?? []),
              { path: '*', Component: NotFound },
            ],
          },
        ],
      },
    ],
  },
];

export const makeRouter = () => createBrowserRouter(routeTree);
