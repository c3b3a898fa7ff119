import { fittingPage } from '@halfpitch/contracts';
import { keepPreviousData, queryOptions } from '@tanstack/react-query';
import { request } from '../../../app/api';

/** Which bike the chain was on, and when. */
export const fittingsQuery = (chainId: string, page: number) =>
  queryOptions({
    queryKey: ['chains', 'fittings', chainId, page],
    queryFn: ({ signal }) =>
      request(`/chains/${chainId}/fittings`, { schema: fittingPage, query: { page, size: 10 }, signal }),
    placeholderData: keepPreviousData,
  });
