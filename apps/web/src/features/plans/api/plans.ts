import { planPage } from '@halfpitch/contracts';
import { queryOptions } from '@tanstack/react-query';
import { request } from '../../../app/api';

/** What is planned on a bike and not over yet, the soonest first. */
export const plansQuery = (bikeId: string) =>
  queryOptions({
    queryKey: ['chains', 'plans', bikeId],
    queryFn: ({ signal }) => request('/plans', { schema: planPage, query: { bikeId, size: 50 }, signal }),
  });
