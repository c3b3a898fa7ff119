import { accuracy } from '@halfpitch/contracts';
import { queryOptions } from '@tanstack/react-query';
import { request } from '../../../app/api';

/** Windows told in the last year against what was found. */
export const accuracyQuery = queryOptions({
  queryKey: ['accuracy'],
  queryFn: ({ signal }) => request('/accuracy', { schema: accuracy, signal }),
});
