import { useRouteError } from 'react-router-dom';
import { ErrorState } from '../components/error-state';

/** What a page shows that broke while it was drawn, or whose code could not be fetched. */
export function PageError() {
  const error = useRouteError();
  return <ErrorState error={error} onRetry={() => window.location.reload()} retryLabel="Reload the page" />;
}
