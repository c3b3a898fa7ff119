import { bike } from '@halfpitch/contracts';
import type { NewBike } from '@halfpitch/contracts';
import { request } from '../../../app/api';

export const addBike = (body: NewBike) => request('/bikes', { method: 'POST', body, schema: bike });
