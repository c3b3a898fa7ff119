import { ridePage } from '@halfpitch/contracts';
import type { RideQuery } from '@halfpitch/contracts';
import { keepPreviousData, queryOptions } from '@tanstack/react-query';
import { request } from '../../../app/api';

/** Rides, newest first; a rider is shown their own only. */
export const ridesQuery = (query: Partial<RideQuery>) =>
  queryOptions({
    queryKey: ['rides', 'list', query],
    queryFn: ({ signal }) => request('/rides', { schema: ridePage, query, signal }),
    placeholderData: keepPreviousData,
  });
