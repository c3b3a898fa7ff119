import type { RouteObject } from 'react-router-dom';
import { forRoles } from '../../app/require-role';

export const routes: RouteObject[] = forRoles(
  ['rider'],
  [
    {
      path: 'account/calendar',
      lazy: async () => ({ Component: (await import('./calendar-page')).CalendarPage }),
    },
  ],
);
