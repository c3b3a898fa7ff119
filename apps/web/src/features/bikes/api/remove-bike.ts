import { done } from '@halfpitch/contracts';
import { request } from '../../../app/api';

export const removeBike = (id: string) => request(`/bikes/${id}`, { method: 'DELETE', schema: done });
