import { done } from '@halfpitch/contracts';
import { request } from '../../../app/api';

export const removeReading = (id: string) => request(`/readings/${id}`, { method: 'DELETE', schema: done });
