import { reminder } from '@halfpitch/contracts';
import { request } from '../../../app/api';

export const holdReminder = (id: string) =>
  request(`/reminders/${id}/hold`, { method: 'POST', schema: reminder });
