import { calendarFeed, done, madeCalendarFeed } from '@halfpitch/contracts';
import { queryOptions } from '@tanstack/react-query';
import { request } from '../../../app/api';

export const calendarQuery = queryOptions({
  queryKey: ['calendar'],
  queryFn: ({ signal }) => request('/calendar', { schema: calendarFeed, signal }),
});

/** Makes the address, or a new one in its place. */
export const makeCalendar = () => request('/calendar', { method: 'POST', schema: madeCalendarFeed });

export const stopCalendar = () => request('/calendar', { method: 'DELETE', schema: done });
