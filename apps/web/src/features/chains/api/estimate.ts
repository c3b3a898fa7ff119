import { chainEstimate } from '@halfpitch/contracts';
import { queryOptions } from '@tanstack/react-query';
import { request } from '../../../app/api';

export const estimateQuery = (chainId: string) =>
  queryOptions({
    queryKey: ['chains', 'estimate', chainId],
    queryFn: ({ signal }) => request(`/chains/${chainId}/estimate`, { schema: chainEstimate, signal }),
  });
