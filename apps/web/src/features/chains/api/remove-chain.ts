import { done } from '@halfpitch/contracts';
import { request } from '../../../app/api';

export const removeChain = (id: string) => request(`/chains/${id}`, { method: 'DELETE', schema: done });
