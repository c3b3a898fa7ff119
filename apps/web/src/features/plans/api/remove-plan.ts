import { done } from '@halfpitch/contracts';
import { request } from '../../../app/api';

export const removePlan = (id: string) => request(`/plans/${id}`, { method: 'DELETE', schema: done });
