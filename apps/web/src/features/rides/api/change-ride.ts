import { ride } from '@halfpitch/contracts';
import type { RideInput } from '@halfpitch/contracts';
import { request } from '../../../app/api';

export const changeRide = (id: string, body: RideInput) =>
  request(`/rides/${id}`, { method: 'PUT', body, schema: ride });
