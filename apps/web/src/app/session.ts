import { done, session } from '@halfpitch/contracts';
import type { Session } from '@halfpitch/contracts';
import { queryOptions, useQuery, useQueryClient } from '@tanstack/react-query';
import { createContext, useContext } from 'react';
import { request } from './api';
import { isSignedOut } from './api-problem';
import { sessionKey } from './session-key';

/** Who is signed in; null when nobody is. */
export const sessionQuery = queryOptions({
  queryKey: sessionKey,
  queryFn: async ({ signal }): Promise<Session | null> => {
    try {
      return await request('/session', { schema: session, signal });
    } catch (error) {
      if (isSignedOut(error)) return null;
      throw error;
    }
  },
  staleTime: 5 * 60_000,
});

export const useSessionQuery = () => useQuery(sessionQuery);
export const SessionContext = createContext<Session | null>(null);

/** The session, on pages behind the sign-in. */
export function useSession(): Session {
  const value = useContext(SessionContext);
  if (!value) throw new Error('useSession is for pages behind the sign-in.');
  return value;
}

/** Ends the session, here or everywhere, and forgets everything that was read in it. */
export function useSignOut() {
  const client = useQueryClient();
  return async (where: 'here' | 'everywhere' = 'here') => {
    const path = where === 'here' ? '/session' : '/session/everywhere';
    await request(path, { method: 'DELETE', schema: done }).catch((error: unknown) => {
      if (!isSignedOut(error)) throw error;
    });
    client.clear();
    client.setQueryData(sessionKey, null);
  };
}
