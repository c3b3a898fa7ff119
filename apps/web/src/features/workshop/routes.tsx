import type { RouteObject } from 'react-router-dom';
import { forRoles } from '../../app/require-role';

export const routes: RouteObject[] = forRoles(
  ['owner'],
  [{ path: 'workshop', lazy: async () => ({ Component: (await import('./workshop')).Workshop }) }],
);
