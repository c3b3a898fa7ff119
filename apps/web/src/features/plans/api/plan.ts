import { plan } from '@halfpitch/contracts';
import { queryOptions } from '@tanstack/react-query';
import { request } from '../../../app/api';

export const planQuery = (id: string) =>
  queryOptions({
    queryKey: ['chains', 'plan', id],
    queryFn: ({ signal }) => request(`/plans/${id}`, { schema: plan, signal }),
  });
