import { workshopSettings } from '@halfpitch/contracts';
import type { WorkshopSettings } from '@halfpitch/contracts';
import { queryOptions } from '@tanstack/react-query';
import { request } from '../../../app/api';

export const settingsQuery = queryOptions({
  queryKey: ['workshop'],
  queryFn: ({ signal }) => request('/workshop', { schema: workshopSettings, signal }),
});

export const changeSettings = (body: WorkshopSettings) =>
  request('/workshop', { method: 'PUT', body, schema: workshopSettings });
