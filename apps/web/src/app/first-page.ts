import type { QueryClient } from '@tanstack/react-query';
import { matchRoutes } from 'react-router-dom';
import type { RouteObject } from 'react-router-dom';
import { sessionQuery } from './session-query';
import { signInAddress } from './sign-in-address';

/**
 * Leads who is not signed in to the sign-in before the code of any page behind it is fetched.
 * When the server can't be asked, the page itself says so.
 */
export async function chooseFirstPage(client: QueryClient, publicRoutes: RouteObject[]): Promise<void> {
  const { pathname, search } = window.location;
  if (matchRoutes(publicRoutes, pathname)) return;
  const session = await client.fetchQuery({ ...sessionQuery, retry: false }).catch(() => undefined);
  if (session === null) window.history.replaceState(null, '', signInAddress(pathname, search));
}
