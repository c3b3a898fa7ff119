import { rider } from '@halfpitch/contracts';
import { request } from '../../../app/api';

/** Writes the rider a letter with a link to join; again, and the link before it ends. */
export const inviteRider = (id: string) =>
  request(`/riders/${id}/invitation`, { method: 'POST', schema: rider });
