import { chain } from '@halfpitch/contracts';
import type { ChainInput } from '@halfpitch/contracts';
import { request } from '../../../app/api';

export const changeChain = (id: string, body: ChainInput) =>
  request(`/chains/${id}`, { method: 'PUT', body, schema: chain });
