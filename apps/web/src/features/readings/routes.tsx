import type { RouteObject } from 'react-router-dom';

export const routes: RouteObject[] = [
  {
    path: 'chains/:id/reading',
    lazy: async () => ({ Component: (await import('./new-reading')).NewReading }),
  },
];
