import { chain } from '@halfpitch/contracts';
import { request } from '../../../app/api';

/** Takes a retired chain back into service. */
export const returnChain = (id: string) => request(`/chains/${id}/return`, { method: 'POST', schema: chain });
