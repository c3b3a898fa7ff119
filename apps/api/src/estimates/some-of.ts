/** At most `most` of the items, evenly over all of them. */
export function someOf<T>(items: readonly T[], most: number): T[] {
  const step = Math.max(items.length / most, 1);
  return items.filter((_, i) => Math.floor(i / step) !== Math.floor((i - 1) / step));
}
