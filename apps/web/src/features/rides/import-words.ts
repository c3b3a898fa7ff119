import type { RideImport } from '@halfpitch/contracts';

export const rideCount = (n: number) => (n === 1 ? '1 ride' : `${n.toLocaleString('en-GB')} rides`);

export type ImportCounts = Pick<RideImport, 'added' | 'alreadyThere' | 'refused' | 'otherSport'>;

/** What came of a file, or of several, in one sentence. */
export function importWords({ added, alreadyThere, refused, otherSport }: ImportCounts): string {
  const rest = refused - otherSport;
  const parts = [
    added > 0 && `${rideCount(added)} added`,
    alreadyThere > 0 && `${rideCount(alreadyThere)} already there`,
    otherSport > 0 && `${otherSport.toLocaleString('en-GB')} of another sport`,
    rest > 0 && `${rest.toLocaleString('en-GB')} not taken`,
  ].filter((part) => part !== false);
  return parts.length === 0 ? 'Nothing was added.' : `${parts.join(', ')}.`;
}

/** What came of several files together. */
export function sumOf(all: readonly ImportCounts[]): ImportCounts {
  const sum = (of: keyof ImportCounts) => all.reduce((total, one) => total + one[of], 0);
  return {
    added: sum('added'),
    alreadyThere: sum('alreadyThere'),
    refused: sum('refused'),
    otherSport: sum('otherSport'),
  };
}

/** Whether the server is through with a file. */
export const isThrough = ({ state }: Pick<RideImport, 'state'>) => state === 'done' || state === 'failed';
