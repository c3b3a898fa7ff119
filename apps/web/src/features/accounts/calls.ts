import { done, session } from '@halfpitch/contracts';
import type {
  acceptInvitation,
  accountChange,
  changePassword,
  registerWorkshop,
  signIn,
} from '@halfpitch/contracts';
import type { z } from 'zod';
import { request } from '../../app/api';

export const postSignIn = (body: z.output<typeof signIn>) =>
  request('/session', { method: 'POST', body, schema: session });

export const postWorkshop = (body: z.output<typeof registerWorkshop>) =>
  request('/workshops', { method: 'POST', body, schema: done });

export const postForgotten = (email: string) =>
  request('/password/forgotten', { method: 'POST', body: { email }, schema: done });

export const postReset = (token: string, password: string) =>
  request('/password/reset', { method: 'POST', body: { token, password }, schema: done });

export const putPassword = (body: z.output<typeof changePassword>) =>
  request('/password', { method: 'PUT', body, schema: done });

export const putAccount = (body: z.output<typeof accountChange>) =>
  request('/account', { method: 'PUT', body, schema: done });

export const postInvitation = (token: string, body: z.output<typeof acceptInvitation>) =>
  request(`/invitations/${encodeURIComponent(token)}`, { method: 'POST', body, schema: done });
