const MOVED = /^from\|([0-9a-f-]{36})\|/;

/** The key under which a ride that went to another bike is known on the bike that its file was meant for. */
export const movedKey = (homeBikeId: string, fingerprint: string): string =>
  `from|${homeBikeId}|${fingerprint}`;

/**
 * The key of a ride on its way from one bike to another: it stays known where it came from, so that its file read again
 * for that bike does not bring it back; back at home it has its first key again.
 */
export function keyOnBike(fingerprint: string, fromBikeId: string, toBikeId: string): string {
  if (fromBikeId === toBikeId) return fingerprint;
  const home = MOVED.exec(fingerprint)?.[1] ?? fromBikeId;
  const first = fingerprint.replace(MOVED, '');
  return home === toBikeId ? first : movedKey(home, first);
}
