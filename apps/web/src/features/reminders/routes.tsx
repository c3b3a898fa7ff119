import type { RouteObject } from 'react-router-dom';
import { forRoles } from '../../app/require-role';

export const routes: RouteObject[] = forRoles(
  ['desk', 'owner'],
  [{ path: 'reminders', lazy: async () => ({ Component: (await import('./reminders')).Reminders }) }],
);
