import { workload } from '@halfpitch/contracts';
import { queryOptions } from '@tanstack/react-query';
import { request } from '../../../app/api';

/** The coming 12 weeks. */
export const workloadQuery = queryOptions({
  queryKey: ['workload'],
  queryFn: ({ signal }) => request('/workload', { schema: workload, signal }),
});
