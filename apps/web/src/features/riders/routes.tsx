import type { RouteObject } from 'react-router-dom';
import { forRoles } from '../../app/require-role';

export const routes: RouteObject[] = [
  ...forRoles(
    ['desk', 'owner'],
    [
      { path: 'riders/new', lazy: async () => ({ Component: (await import('./new-rider')).NewRider }) },
      {
        path: 'riders/:id/edit',
        lazy: async () => ({ Component: (await import('./edit-rider')).EditRider }),
      },
    ],
  ),
  ...forRoles(
    ['mechanic', 'desk', 'owner'],
    [
      { path: 'riders', lazy: async () => ({ Component: (await import('./riders')).Riders }) },
      { path: 'riders/:id', lazy: async () => ({ Component: (await import('./rider-page')).RiderPage }) },
    ],
  ),
];
