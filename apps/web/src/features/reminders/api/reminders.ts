import { reminderPage } from '@halfpitch/contracts';
import type { ReminderQuery } from '@halfpitch/contracts';
import { keepPreviousData, queryOptions } from '@tanstack/react-query';
import { request } from '../../../app/api';

/** Letters to riders, newest first. */
export const remindersQuery = (query: Partial<ReminderQuery>) =>
  queryOptions({
    queryKey: ['reminders', 'list', query],
    queryFn: ({ signal }) => request('/reminders', { schema: reminderPage, query, signal }),
    placeholderData: keepPreviousData,
  });
