import { estimationModel } from '@halfpitch/contracts';
import { queryOptions } from '@tanstack/react-query';
import { request } from '../../../app/api';

/** What this workshop's estimates are worked out with. */
export const modelQuery = queryOptions({
  queryKey: ['model'],
  queryFn: ({ signal }) => request('/model', { schema: estimationModel, signal }),
});
