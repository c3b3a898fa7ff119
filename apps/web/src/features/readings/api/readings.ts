import { readingPage } from '@halfpitch/contracts';
import { keepPreviousData, queryOptions } from '@tanstack/react-query';
import { request } from '../../../app/api';

/** What was measured on a chain, newest first. */
export const readingsQuery = (chainId: string, page: number, size = 10) =>
  queryOptions({
    queryKey: ['readings', chainId, page, size],
    queryFn: ({ signal }) =>
      request('/readings', { schema: readingPage, query: { chainId, page, size }, signal }),
    placeholderData: keepPreviousData,
  });
