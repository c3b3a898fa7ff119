import { rideImport } from '@halfpitch/contracts';
import { queryOptions } from '@tanstack/react-query';
import { request } from '../../../app/api';
import { isThrough } from '../import-words';

const EVERY_MS = 700;

/** How far the server is with a file; asked again until it is through. */
export const importQuery = (id: string) =>
  queryOptions({
    queryKey: ['imports', id],
    queryFn: ({ signal }) => request(`/imports/${id}`, { schema: rideImport, signal }),
    refetchInterval: ({ state }) => (state.data && isThrough(state.data) ? false : EVERY_MS),
  });
