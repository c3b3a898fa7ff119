import { invitationView } from '@halfpitch/contracts';
import { queryOptions } from '@tanstack/react-query';
import { request } from '../../app/api';

/** What an invitation says; apart from the other calls, which the first page loads. */
export const invitationQuery = (token: string) =>
  queryOptions({
    queryKey: ['invitation', token],
    queryFn: () => request(`/invitations/${encodeURIComponent(token)}`, { schema: invitationView }),
    staleTime: Infinity,
  });
