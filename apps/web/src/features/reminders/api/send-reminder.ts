import { reminder } from '@halfpitch/contracts';
import type { SendReminder } from '@halfpitch/contracts';
import { request } from '../../../app/api';

/** Writes now, without waiting for the night; with `hold` none is sent until it is released. */
export const sendReminder = (body: SendReminder) =>
  request('/reminders', { method: 'POST', body, schema: reminder });
