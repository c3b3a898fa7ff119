import { ride } from '@halfpitch/contracts';
import type { RideInput } from '@halfpitch/contracts';
import { request } from '../../../app/api';

/** Sent twice under one key, the ride is kept once. */
export const addRide = (body: RideInput, idempotencyKey: string) =>
  request('/rides', { method: 'POST', body, schema: ride, idempotencyKey });
