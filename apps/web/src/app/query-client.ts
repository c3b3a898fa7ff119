import { MutationCache, QueryCache, QueryClient } from '@tanstack/react-query';
import { ApiProblem, isSignedOut } from './api-problem';
import { sessionKey } from './session-key';

const retries = (failures: number, error: Error) =>
  failures < 2 && (!(error instanceof ApiProblem) || error.status === 0 || error.status >= 500);

/** One answer of "not signed in" anywhere ends the session here too; the shell then leads to the sign-in. */
export function makeQueryClient(): QueryClient {
  const onError = (error: unknown) => {
    if (isSignedOut(error)) client.setQueryData(sessionKey, null);
  };
  const client: QueryClient = new QueryClient({
    queryCache: new QueryCache({ onError }),
    mutationCache: new MutationCache({ onError }),
    defaultOptions: {
      queries: { retry: retries, staleTime: 15_000, refetchOnWindowFocus: true },
      mutations: { networkMode: 'always' },
    },
  });
  return client;
}
