import { ride } from '@halfpitch/contracts';
import { request } from '../../../app/api';

/** Puts back a ride that was removed a short while ago. */
export const restoreRide = (id: string) => request(`/rides/${id}/restore`, { method: 'POST', schema: ride });
