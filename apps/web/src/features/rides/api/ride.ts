import { ride } from '@halfpitch/contracts';
import { queryOptions } from '@tanstack/react-query';
import { request } from '../../../app/api';

export const rideQuery = (id: string) =>
  queryOptions({
    queryKey: ['rides', 'one', id],
    queryFn: ({ signal }) => request(`/rides/${id}`, { schema: ride, signal }),
  });
