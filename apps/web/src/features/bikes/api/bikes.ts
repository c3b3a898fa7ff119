import { bikePage } from '@halfpitch/contracts';
import type { BikeQuery } from '@halfpitch/contracts';
import { queryOptions } from '@tanstack/react-query';
import { request } from '../../../app/api';

/** Bikes by name; a rider is shown their own only. Nobody has more than one page of them. */
export const bikesQuery = (query: Pick<Partial<BikeQuery>, 'riderId'> = {}) =>
  queryOptions({
    queryKey: ['bikes', 'list', query],
    queryFn: ({ signal }) => request('/bikes', { schema: bikePage, query: { ...query, size: 200 }, signal }),
  });
