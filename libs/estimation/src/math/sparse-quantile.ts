import { normalQuantile } from './normal';

const LEVELS = [0.02, 0.1, 0.28, 0.5, 0.72, 0.9, 0.98];
const SCORES = LEVELS.map(normalQuantile);

/** A costly quantile function asked at seven levels only, and straight between them on normal scores (and beyond). */
export function sparseQuantile(quantile: (p: number) => number): (p: number) => number {
  const values = LEVELS.map(quantile);
  return (p) => {
    const score = normalQuantile(p);
    let i = 1;
    while (i < SCORES.length - 1 && SCORES[i]! < score) i++;
    const share = (score - SCORES[i - 1]!) / (SCORES[i]! - SCORES[i - 1]!);
    return values[i - 1]! + share * (values[i]! - values[i - 1]!);
  };
}
