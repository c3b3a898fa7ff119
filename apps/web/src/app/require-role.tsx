import type { Role } from '@halfpitch/contracts';
import { Outlet } from 'react-router-dom';
import type { RouteObject } from 'react-router-dom';
import { EmptyState } from '../components/empty-state';
import { useSession } from './session';

/** Shows its pages to the given roles; the server holds the same line. */
export function RequireRole({ roles }: { roles: readonly Role[] }) {
  const { role } = useSession();
  if (roles.includes(role)) return <Outlet />;
  return (
    <EmptyState title="This page is not for your role">
      Ask the workshop’s owner if you need what is on it.
    </EmptyState>
  );
}

/** Routes for some roles only: `forRoles(['owner'], [{ path: 'weeks', lazy }])`. */
export const forRoles = (roles: readonly Role[], children: RouteObject[]): RouteObject[] => [
  { element: <RequireRole roles={roles} />, children },
];
