import { plan } from '@halfpitch/contracts';
import type { PlanInput } from '@halfpitch/contracts';
import { request } from '../../../app/api';

export const changePlan = (id: string, body: PlanInput) =>
  request(`/plans/${id}`, { method: 'PUT', body, schema: plan });
