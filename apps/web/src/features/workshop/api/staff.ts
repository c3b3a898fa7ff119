import { done, staffMember, staffPage } from '@halfpitch/contracts';
import type { inviteStaff } from '@halfpitch/contracts';
import { queryOptions } from '@tanstack/react-query';
import type { z } from 'zod';
import { request } from '../../../app/api';

/** Everyone who works here; nobody has more than one page of them. */
export const staffQuery = queryOptions({
  queryKey: ['staff'],
  queryFn: ({ signal }) => request('/staff', { schema: staffPage, query: { size: 200 }, signal }),
});

export const addStaff = (body: z.output<typeof inviteStaff>) =>
  request('/staff', { method: 'POST', body, schema: staffMember });

export const removeStaff = (id: string) => request(`/staff/${id}`, { method: 'DELETE', schema: done });
