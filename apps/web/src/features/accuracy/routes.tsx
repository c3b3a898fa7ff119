import type { RouteObject } from 'react-router-dom';
import { forRoles } from '../../app/require-role';

export const routes: RouteObject[] = forRoles(
  ['mechanic', 'desk', 'owner'],
  [{ path: 'accuracy', lazy: async () => ({ Component: (await import('./accuracy-page')).AccuracyPage }) }],
);
