/** The point of `sorted` values below which a share `p` of their weight lies, interpolated between atom centres. */
export function weightedQuantile(values: readonly number[], weights: readonly number[], p: number): number {
  const order = values.map((_, i) => i).sort((i, j) => values[i]! - values[j]!);
  const total = weights.reduce((sum, w) => sum + w, 0);
  let before = 0;
  let last = values[order[0]!]!;
  let lastCentre = 0;
  for (const i of order) {
    const w = weights[i]! / total;
    if (w <= 0) continue;
    const centre = before + w / 2;
    if (centre >= p) {
      const span = centre - lastCentre;
      return before === 0 || span <= 0 ? values[i]! : last + ((values[i]! - last) * (p - lastCentre)) / span;
    }
    before += w;
    last = values[i]!;
    lastCentre = centre;
  }
  return last;
}

/** P10, P50 and P90 of weighted atoms. */
export function weightedBand(values: readonly number[], weights: readonly number[]) {
  const at = (p: number) => weightedQuantile(values, weights, p);
  return { p10: at(0.1), p50: at(0.5), p90: at(0.9) };
}
