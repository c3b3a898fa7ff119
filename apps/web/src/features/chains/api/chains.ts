import { chainPage } from '@halfpitch/contracts';
import type { ChainQuery } from '@halfpitch/contracts';
import { queryOptions } from '@tanstack/react-query';
import { request } from '../../../app/api';

/** All chains of a rider or a bike, in service or retired; a rider is shown their own only. */
export const allChainsQuery = (query: Pick<Partial<ChainQuery>, 'riderId' | 'bikeId' | 'retired'> = {}) =>
  queryOptions({
    queryKey: ['chains', 'all', query],
    queryFn: ({ signal }) =>
      request('/chains', { schema: chainPage, query: { ...query, size: 200 }, signal }),
  });
