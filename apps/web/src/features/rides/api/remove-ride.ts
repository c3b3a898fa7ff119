import { done } from '@halfpitch/contracts';
import { request } from '../../../app/api';

export const removeRide = (id: string) => request(`/rides/${id}`, { method: 'DELETE', schema: done });
