import { odometerReading } from '@halfpitch/contracts';
import type { OdometerInput } from '@halfpitch/contracts';
import { request } from '../../../app/api';

/** Given twice for a day, the later figure holds. */
export const addOdometer = (bikeId: string, body: OdometerInput) =>
  request(`/bikes/${bikeId}/odometer`, { method: 'POST', body, schema: odometerReading });
