import { z } from 'zod';
import { day, id, instant, pageOf, shortText } from './common';
import type { Permission } from './permissions';

/** What a script may do with a token: each scope adds a few permissions, never more than its person has. */
export const tokenScopes = ['read', 'rides:write', 'readings:write'] as const;
export type TokenScope = (typeof tokenScopes)[number];

const grants: Record<TokenScope, readonly Permission[]> = {
  read: ['bikes.read', 'estimates.read'],
  'rides:write': ['rides.write'],
  'readings:write': ['readings.write'],
};

/** Whether any of the scopes includes what a call asks for. */
export function scopesInclude(scopes: readonly TokenScope[], permission: Permission): boolean {
  return scopes.some((scope) => grants[scope].includes(permission));
}

/** POST /api/account/tokens */
export const newApiToken = z.object({
  name: shortText('a name that tells what the token is for', 60),
  scopes: z
    .array(z.enum(tokenScopes))
    .min(1, 'Choose at least one thing the token may do.')
    .transform((scopes) => [...new Set(scopes)]),
  /** The last day it works, or null for no end. */
  lastDay: day.nullable().default(null),
});
export type NewApiToken = z.infer<typeof newApiToken>;

/** GET /api/account/tokens, DELETE /api/account/tokens/:id */
export const apiToken = z.object({
  id,
  name: z.string(),
  scopes: z.array(z.enum(tokenScopes)),
  workshopName: z.string(),
  createdAt: instant,
  lastUsedAt: instant.nullable(),
  lastDay: day.nullable(),
  expired: z.boolean(),
});
export type ApiToken = z.infer<typeof apiToken>;
export const apiTokenPage = pageOf(apiToken);

/** What making one answers: the only time the secret is seen. */
export const madeApiToken = z.object({ token: apiToken, secret: z.string() });
export type MadeApiToken = z.infer<typeof madeApiToken>;
