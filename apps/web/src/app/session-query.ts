import { session } from '@halfpitch/contracts';
import type { Session } from '@halfpitch/contracts';
import { queryOptions } from '@tanstack/react-query';
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
