/** Rows by the value of a key, each turned into what is wanted of it. */
export function groupBy<Row, T>(
  rows: readonly Row[],
  key: (row: Row) => string | null,
  to: (row: Row) => T,
): Map<string, T[]> {
  const groups = new Map<string, T[]>();
  for (const row of rows) {
    const of = key(row);
    if (of === null) continue;
    const group = groups.get(of);
    if (group) group.push(to(row));
    else groups.set(of, [to(row)]);
  }
  return groups;
}
