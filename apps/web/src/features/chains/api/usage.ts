import { usage } from '@halfpitch/contracts';
import { queryOptions } from '@tanstack/react-query';
import { request } from '../../../app/api';

/** Distance since each treatment, by day. */
export const usageQuery = (chainId: string) =>
  queryOptions({
    queryKey: ['chains', 'usage', chainId],
    queryFn: ({ signal }) => request(`/chains/${chainId}/usage`, { schema: usage, signal }),
  });
