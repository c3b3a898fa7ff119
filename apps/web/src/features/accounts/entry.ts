import { useQueryClient } from '@tanstack/react-query';
import { useNavigate, useSearchParams } from 'react-router-dom';
import { sessionKey } from '../../app/session-key';

/** Where to go after the sign-in: only an address of this site. */
export const safeReturn = (to: string | null): string => (to && /^\/(?![/\\])/.test(to) ? to : '/');

/** Fetches the new session and goes to where the person wanted to be. */
export function useEnter() {
  const client = useQueryClient();
  const navigate = useNavigate();
  const [search] = useSearchParams();
  return async () => {
    client.removeQueries({ queryKey: sessionKey });
    await navigate(safeReturn(search.get('to')), { replace: true });
  };
}
