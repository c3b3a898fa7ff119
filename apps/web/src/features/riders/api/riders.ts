import { riderPage } from '@halfpitch/contracts';
import type { RiderQuery } from '@halfpitch/contracts';
import { keepPreviousData, queryOptions } from '@tanstack/react-query';
import { request } from '../../../app/api';

export const ridersQuery = (query: Partial<RiderQuery>) =>
  queryOptions({
    queryKey: ['riders', 'list', query],
    queryFn: ({ signal }) => request('/riders', { schema: riderPage, query, signal }),
    placeholderData: keepPreviousData,
  });
