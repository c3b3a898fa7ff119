import { reading } from '@halfpitch/contracts';
import type { ReadingInput } from '@halfpitch/contracts';
import { request } from '../../../app/api';

/** Sent twice under one key, the reading is kept once. */
export const addReading = (body: ReadingInput, idempotencyKey: string) =>
  request('/readings', { method: 'POST', body, schema: reading, idempotencyKey });
