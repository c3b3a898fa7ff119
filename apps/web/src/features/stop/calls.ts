import { stopView } from '@halfpitch/contracts';
import { queryOptions } from '@tanstack/react-query';
import { request } from '../../app/api';

const path = (token: string) => `/stop/${encodeURIComponent(token)}`;

export const stopQuery = (token: string) =>
  queryOptions({
    queryKey: ['stop', token],
    queryFn: ({ signal }) => request(path(token), { schema: stopView, signal }),
  });

export const postStop = (token: string, on: boolean) =>
  request(path(token), { method: 'POST', body: { on }, schema: stopView });
