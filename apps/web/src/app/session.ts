import { done } from '@halfpitch/contracts';
import type { Session } from '@halfpitch/contracts';
import { useQueryClient } from '@tanstack/react-query';
import { createContext, useContext } from 'react';
import { request } from './api';
import { isSignedOut } from './api-problem';
import { sessionKey } from './session-key';

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
