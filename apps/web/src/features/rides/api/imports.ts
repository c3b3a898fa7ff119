import { rideImportPage } from '@halfpitch/contracts';
import type { RideImportQuery } from '@halfpitch/contracts';
import { queryOptions } from '@tanstack/react-query';
import { request } from '../../../app/api';
import { isThrough } from '../import-words';

const EVERY_MS = 1500;

/** Files sent before, newest first; asked again while one is being read. */
export const importsQuery = (query: Partial<RideImportQuery>) =>
  queryOptions({
    queryKey: ['imports', 'list', query],
    queryFn: ({ signal }) => request('/imports', { schema: rideImportPage, query, signal }),
    refetchInterval: ({ state }) => (state.data?.items.every(isThrough) === false ? EVERY_MS : false),
  });
