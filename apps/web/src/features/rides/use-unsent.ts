import { useEffect, useState } from 'react';
import { isUnsent } from './upload';
import type { Upload } from './upload';

const placeOf = (riderId: string) => `halfpitch.unsent.${riderId}`;

function kept(riderId: string): string[] {
  try {
    const names: unknown = JSON.parse(localStorage.getItem(placeOf(riderId)) ?? '[]');
    return Array.isArray(names) ? names.filter((name) => typeof name === 'string') : [];
  } catch {
    return [];
  }
}

function keep(riderId: string, names: string[]): void {
  try {
    if (names.length > 0) localStorage.setItem(placeOf(riderId), JSON.stringify(names));
    else localStorage.removeItem(placeOf(riderId));
  } catch {
    // A browser that keeps nothing can't tell next time: what arrived is in the list of files all the same.
  }
}

/** Names of files that had not been sent when this page was left, on this device; those chosen again drop out. */
export function useUnsent(riderId: string, uploads: readonly Upload[]) {
  const [left, setLeft] = useState(() => kept(riderId));
  const remaining = left.filter((name) => !uploads.some(({ file }) => file.name === name));
  const unsent = uploads.filter(isUnsent).map(({ file }) => file.name);
  const names = JSON.stringify([...new Set([...remaining, ...unsent])]);
  useEffect(() => keep(riderId, JSON.parse(names) as string[]), [riderId, names]);
  const isSending = unsent.length > 0;
  useEffect(() => {
    if (!isSending) return undefined;
    const ask = (event: BeforeUnloadEvent) => event.preventDefault();
    window.addEventListener('beforeunload', ask);
    return () => window.removeEventListener('beforeunload', ask);
  }, [isSending]);
  return { remaining, forget: () => setLeft([]) };
}
