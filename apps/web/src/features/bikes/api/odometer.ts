import { odometerPage } from '@halfpitch/contracts';
import { keepPreviousData, queryOptions } from '@tanstack/react-query';
import { request } from '../../../app/api';

/** Odometer readings of a bike, newest first. */
export const odometerQuery = (bikeId: string, page: number) =>
  queryOptions({
    queryKey: ['bikes', 'odometer', bikeId, page],
    queryFn: ({ signal }) =>
      request(`/bikes/${bikeId}/odometer`, { schema: odometerPage, query: { page, size: 10 }, signal }),
    placeholderData: keepPreviousData,
  });
