import { done, rider } from '@halfpitch/contracts';
import type { RiderInput } from '@halfpitch/contracts';
import { queryOptions } from '@tanstack/react-query';
import { request } from '../../../app/api';

export const riderQuery = (id: string) =>
  queryOptions({
    queryKey: ['riders', 'one', id],
    queryFn: ({ signal }) => request(`/riders/${id}`, { schema: rider, signal }),
  });

export const addRider = (body: RiderInput) => request('/riders', { method: 'POST', body, schema: rider });

export const changeRider = (id: string, body: RiderInput) =>
  request(`/riders/${id}`, { method: 'PUT', body, schema: rider });

/** Removes the rider with bikes, chains and everything logged. */
export const removeRider = (id: string) => request(`/riders/${id}`, { method: 'DELETE', schema: done });
