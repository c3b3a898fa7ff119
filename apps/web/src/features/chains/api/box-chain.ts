import { chain } from '@halfpitch/contracts';
import { request } from '../../../app/api';

export const boxChain = (id: string, day: string) =>
  request(`/chains/${id}/box`, { method: 'POST', body: { day }, schema: chain });
