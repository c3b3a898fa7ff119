import type { RideImport } from '@halfpitch/contracts';

const rides = (n: number) => (n === 1 ? '1 ride' : `${n.toLocaleString('en-GB')} rides`);

/** What came of a file, in one sentence. */
export function importWords({
  added,
  alreadyThere,
  refused,
}: Pick<RideImport, 'added' | 'alreadyThere' | 'refused'>): string {
  const parts = [
    added > 0 && `${rides(added)} added`,
    alreadyThere > 0 && `${rides(alreadyThere)} already there`,
    refused > 0 && `${refused.toLocaleString('en-GB')} not taken`,
  ].filter((part) => part !== false);
  return parts.length === 0 ? 'Nothing was added.' : `${parts.join(', ')}.`;
}
