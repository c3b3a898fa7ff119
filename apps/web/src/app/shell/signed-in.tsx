import { useQuery } from '@tanstack/react-query';
import { Navigate, useLocation } from 'react-router-dom';
import { ErrorState } from '../../components/error-state';
import { PageLoading } from '../../components/loading-state';
import { SessionContext } from '../session';
import { sessionQuery } from '../session-query';
import { signInAddress } from '../sign-in-address';
import { MoreParts } from '../theme/more-provider';
import { homeOf } from './nav-items';
import { Shell } from './shell';

/** Lets in who is signed in; others go to the sign-in and come back to where they wanted to be. */
export function Component() {
  const { data: session, error, refetch } = useQuery(sessionQuery);
  const { pathname, search } = useLocation();
  if (error && !session) return <ErrorState error={error} onRetry={() => void refetch()} />;
  if (session === undefined) return <PageLoading />;
  if (session === null) return <Navigate to={signInAddress(pathname, search)} replace />;
  if (pathname === '/' && homeOf(session.role) !== '/') return <Navigate to={homeOf(session.role)} replace />;
  return (
    <SessionContext value={session}>
      <MoreParts>
        <Shell />
      </MoreParts>
    </SessionContext>
  );
}
