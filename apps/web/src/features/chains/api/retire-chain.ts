import { chain } from '@halfpitch/contracts';
import type { RetireChain } from '@halfpitch/contracts';
import { request } from '../../../app/api';

export const retireChain = (id: string, body: RetireChain) =>
  request(`/chains/${id}/retire`, { method: 'POST', body, schema: chain });
