import { rider } from '@halfpitch/contracts';
import { request } from '../../../app/api';

/** Turns the letters to a rider on or off. */
export const switchReminders = (id: string, on: boolean) =>
  request(`/riders/${id}/reminders`, { method: 'PUT', body: { on }, schema: rider });
