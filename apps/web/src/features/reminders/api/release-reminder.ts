import { reminder } from '@halfpitch/contracts';
import { request } from '../../../app/api';

/** Lets a held reminder go: its letter is written anew from today's estimate. */
export const releaseReminder = (id: string) =>
  request(`/reminders/${id}/release`, { method: 'POST', schema: reminder });
