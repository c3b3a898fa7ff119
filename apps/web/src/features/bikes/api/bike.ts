import { bike } from '@halfpitch/contracts';
import { queryOptions } from '@tanstack/react-query';
import { request } from '../../../app/api';

export const bikeQuery = (id: string) =>
  queryOptions({
    queryKey: ['bikes', 'one', id],
    queryFn: ({ signal }) => request(`/bikes/${id}`, { schema: bike, signal }),
  });
