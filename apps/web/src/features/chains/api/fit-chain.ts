import { chain } from '@halfpitch/contracts';
import type { FitChain } from '@halfpitch/contracts';
import { request } from '../../../app/api';

/** Puts it on a bike; the chain that was on it goes into the box. */
export const fitChain = (id: string, body: FitChain) =>
  request(`/chains/${id}/fit`, { method: 'POST', body, schema: chain });
