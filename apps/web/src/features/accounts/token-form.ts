import { newApiToken } from '@halfpitch/contracts';
import type { TokenScope } from '@halfpitch/contracts';
import { z } from 'zod';

/** What a token may do, as its person chooses it. */
export const tokenUses = {
  read: { label: 'Read', hint: 'bikes, chains, rides, dates', scopes: ['read'] },
  rides: { label: 'Log rides', hint: 'and read', scopes: ['read', 'rides:write'] },
  both: {
    label: 'Log rides and readings',
    hint: 'and read',
    scopes: ['read', 'rides:write', 'readings:write'],
  },
} satisfies Record<string, { label: string; hint: string; scopes: TokenScope[] }>;

/** The form's fields, turned into what the server is asked for. */
export const tokenForm = newApiToken
  .pick({ name: true, lastDay: true })
  .extend({ use: z.enum(['read', 'rides', 'both']) })
  .transform(({ use, ...rest }) => ({ ...rest, scopes: [...tokenUses[use].scopes] }));

export const scopeWords: Record<TokenScope, string> = {
  read: 'reads',
  'rides:write': 'logs rides',
  'readings:write': 'logs readings',
};
