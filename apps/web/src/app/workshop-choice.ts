import { session } from '@halfpitch/contracts';
import { useQueryClient } from '@tanstack/react-query';
import { useNavigate } from 'react-router-dom';
import { request } from './api';
import { sessionKey } from './session-key';

/** Goes on in another workshop one belongs to; nothing read in the first is kept. */
export function useChooseWorkshop() {
  const client = useQueryClient();
  const navigate = useNavigate();
  return async (workshopId: string) => {
    const next = await request('/session/workshop', {
      method: 'POST',
      body: { workshopId },
      schema: session,
    });
    client.clear();
    client.setQueryData(sessionKey, next);
    await navigate('/');
  };
}
