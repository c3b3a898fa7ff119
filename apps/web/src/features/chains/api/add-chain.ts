import { chain } from '@halfpitch/contracts';
import type { NewChain } from '@halfpitch/contracts';
import { request } from '../../../app/api';

export const addChain = (body: NewChain) => request('/chains', { method: 'POST', body, schema: chain });
