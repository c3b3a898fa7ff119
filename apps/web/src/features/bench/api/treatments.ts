import { done, treatment, treatmentPage } from '@halfpitch/contracts';
import type { TreatmentInput } from '@halfpitch/contracts';
import { queryOptions } from '@tanstack/react-query';
import { request } from '../../../app/api';

/** What was done to a chain, newest first. */
export const treatmentsQuery = (chainId: string) =>
  queryOptions({
    queryKey: ['treatments', chainId],
    queryFn: ({ signal }) =>
      request('/treatments', { schema: treatmentPage, query: { chainId, size: 5 }, signal }),
  });

export const postTreatment = (body: TreatmentInput) =>
  request('/treatments', { method: 'POST', body, schema: treatment });

export const deleteTreatment = (id: string) =>
  request(`/treatments/${id}`, { method: 'DELETE', schema: done });
