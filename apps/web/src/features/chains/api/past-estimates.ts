import { pastEstimatePage } from '@halfpitch/contracts';
import { keepPreviousData, queryOptions } from '@tanstack/react-query';
import { request } from '../../../app/api';

/** What was believed when, newest first. */
export const pastEstimatesQuery = (chainId: string, page: number) =>
  queryOptions({
    queryKey: ['chains', 'estimates', chainId, page],
    queryFn: ({ signal }) =>
      request(`/chains/${chainId}/estimates`, {
        schema: pastEstimatePage,
        query: { page, size: 10 },
        signal,
      }),
    placeholderData: keepPreviousData,
  });
