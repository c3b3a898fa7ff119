import { done } from '@halfpitch/contracts';
import { request } from '../../../app/api';

export const removeOdometer = (bikeId: string, readingId: string) =>
  request(`/bikes/${bikeId}/odometer/${readingId}`, { method: 'DELETE', schema: done });
