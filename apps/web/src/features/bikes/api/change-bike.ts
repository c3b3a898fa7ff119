import { bike } from '@halfpitch/contracts';
import type { BikeInput } from '@halfpitch/contracts';
import { request } from '../../../app/api';

export const changeBike = (id: string, body: BikeInput) =>
  request(`/bikes/${id}`, { method: 'PUT', body, schema: bike });
