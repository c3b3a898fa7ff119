import type { RouteObject } from 'react-router-dom';

export const publicRoutes: RouteObject[] = [
  {
    lazy: async () => ({ Component: (await import('../accounts/entrance')).Entrance }),
    children: [{ path: 'stop/:token', lazy: async () => ({ Component: (await import('./stop')).Stop }) }],
  },
];
