import type { RouteObject } from 'react-router-dom';

export const routes: RouteObject[] = [
  { path: 'plans/new', lazy: async () => ({ Component: (await import('./new-plan')).NewPlan }) },
  { path: 'plans/:id', lazy: async () => ({ Component: (await import('./edit-plan')).EditPlan }) },
];
