import type { RouteObject } from 'react-router-dom';

export const routes: RouteObject[] = [
  { index: true, lazy: async () => ({ Component: (await import('./my-bikes')).MyBikes }) },
  { path: 'bikes/new', lazy: async () => ({ Component: (await import('./new-bike')).NewBike }) },
  { path: 'bikes/:id', lazy: async () => ({ Component: (await import('./bike-page')).BikePage }) },
  { path: 'bikes/:id/edit', lazy: async () => ({ Component: (await import('./edit-bike')).EditBike }) },
];
