import { treatmentPage } from '@halfpitch/contracts';
import { keepPreviousData, queryOptions } from '@tanstack/react-query';
import { request } from '../../../app/api';

/** What was done to a chain, newest first. */
export const treatmentsQuery = (chainId: string, page: number) =>
  queryOptions({
    queryKey: ['treatments', chainId, page],
    queryFn: ({ signal }) =>
      request('/treatments', { schema: treatmentPage, query: { chainId, page, size: 10 }, signal }),
    placeholderData: keepPreviousData,
  });
