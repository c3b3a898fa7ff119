/** So many things for so many takers, as evenly as whole numbers allow. */
export function shareOut(things: number, takers: number): number[] {
  const upTo = (n: number) => Math.floor((n * things) / takers);
  return Array.from({ length: takers }, (_, i) => upTo(i + 1) - upTo(i));
}

/** Chains for bikes, one at least: what is over goes out in ones and in twos, so that rotations of two and three occur. */
export function chainsOfBikes(chains: number, bikes: number): number[] {
  const spare = shareOut(chains - bikes, Math.ceil(bikes / 4));
  return spare.flatMap((over, group) => {
    const size = Math.min(4, bikes - 4 * group);
    const each = Array.from({ length: size }, () => 1);
    const portion = group % 2 === 0 ? 2 : 1;
    for (let i = 0, left = over; left > 0; i = (i + 1) % size) {
      const given = Math.min(portion, left);
      each[i] = (each[i] ?? 1) + given;
      left -= given;
    }
    return each;
  });
}
