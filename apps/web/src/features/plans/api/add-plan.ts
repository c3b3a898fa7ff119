import { plan } from '@halfpitch/contracts';
import type { PlanInput } from '@halfpitch/contracts';
import { request } from '../../../app/api';

export const addPlan = (body: PlanInput) => request('/plans', { method: 'POST', body, schema: plan });
