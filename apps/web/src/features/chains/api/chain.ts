import { chain } from '@halfpitch/contracts';
import { queryOptions } from '@tanstack/react-query';
import { request } from '../../../app/api';

export const chainQuery = (id: string) =>
  queryOptions({
    queryKey: ['chains', 'one', id],
    queryFn: ({ signal }) => request(`/chains/${id}`, { schema: chain, signal }),
  });
