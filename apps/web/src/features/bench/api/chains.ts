import { chainPage } from '@halfpitch/contracts';
import type { ChainQuery } from '@halfpitch/contracts';
import { keepPreviousData, queryOptions } from '@tanstack/react-query';
import { request } from '../../../app/api';

/** A page of chains; 'soonest' puts what falls due first at the top. */
export const chainsQuery = (query: Partial<ChainQuery>) =>
  queryOptions({
    queryKey: ['chains', 'list', query],
    queryFn: ({ signal }) => request('/chains', { schema: chainPage, query, signal }),
    placeholderData: keepPreviousData,
  });
