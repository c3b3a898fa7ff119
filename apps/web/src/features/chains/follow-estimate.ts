import type { QueryClient } from '@tanstack/react-query';
import { useQueryClient } from '@tanstack/react-query';
import { useCallback } from 'react';
import { chainQuery } from './api/chain';

/** When to look again, ms after the last look: a new estimate is there within a second or two. */
const LOOKS_MS = [400, 600, 800, 1200, 2000, 3000];
const CHANGED = ['bikes', 'chains', 'rides', 'readings', 'treatments'];
const pause = (ms: number) => new Promise((resolve) => setTimeout(resolve, ms));

const madeAt = async (client: QueryClient, chainId: string) =>
  (await client.fetchQuery({ ...chainQuery(chainId), staleTime: 0 })).state?.madeAt;

/** Reads everything again that a change may have touched, and the chain's figures once it is estimated anew. */
export async function followEstimate(client: QueryClient, chainId: string | null): Promise<void> {
  const before = chainId === null ? undefined : await madeAt(client, chainId).catch(() => undefined);
  await Promise.all(CHANGED.map((key) => client.invalidateQueries({ queryKey: [key] })));
  if (chainId === null) return;
  for (const wait of LOOKS_MS) {
    await pause(wait);
    const now = await madeAt(client, chainId).catch(() => before);
    if (now !== before) break;
  }
  await client.invalidateQueries({ queryKey: ['chains'] });
}

/** For after a change: `changed(ride.chainId)`; it needs no waiting for. */
export function useChanged() {
  const client = useQueryClient();
  return useCallback((chainId: string | null) => void followEstimate(client, chainId), [client]);
}
