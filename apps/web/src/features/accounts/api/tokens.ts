import { apiTokenPage, done, madeApiToken } from '@halfpitch/contracts';
import type { NewApiToken } from '@halfpitch/contracts';
import { queryOptions } from '@tanstack/react-query';
import { request } from '../../../app/api';

/** A person's own tokens, newest first; nobody has more than one page of them. */
export const tokensQuery = queryOptions({
  queryKey: ['account', 'tokens'],
  queryFn: ({ signal }) => request('/account/tokens', { schema: apiTokenPage, query: { size: 200 }, signal }),
});

export const addToken = (body: NewApiToken) =>
  request('/account/tokens', { method: 'POST', body, schema: madeApiToken });

export const revokeToken = (id: string) =>
  request(`/account/tokens/${id}`, { method: 'DELETE', schema: done });
