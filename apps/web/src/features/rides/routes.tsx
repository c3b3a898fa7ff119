import type { RouteObject } from 'react-router-dom';

export const routes: RouteObject[] = [
  { path: 'log', lazy: async () => ({ Component: (await import('./log-ride')).LogRide }) },
  { path: 'rides/:id', lazy: async () => ({ Component: (await import('./edit-ride')).EditRide }) },
  { path: 'import', lazy: async () => ({ Component: (await import('./import-files')).ImportFiles }) },
];
