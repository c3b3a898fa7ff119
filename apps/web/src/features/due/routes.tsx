import type { RouteObject } from 'react-router-dom';
import { forRoles } from '../../app/require-role';

export const routes: RouteObject[] = forRoles(
  ['desk', 'owner'],
  [{ path: 'due', lazy: async () => ({ Component: (await import('./due')).Due }) }],
);
