import type { Coefficients } from './model';

/** How strongly a feature's effect may change with the distance, relative to the effect itself. */
const CHANGE_WITH_KM = 0.55;
const CLIP = 3;

/** Log distance, centred and scaled over what is taught. */
export const logKm = (km: number): number => Math.log(Math.min(Math.max(km, 100), 3000) / 670) / 0.8;

/** One row of the regression: 1, standardised features, log km and its square, and features times log km. */
export function designRow(
  features: readonly number[],
  km: number,
  { mean, sd }: Pick<Coefficients, 'mean' | 'sd'>,
): Float64Array {
  const n = features.length;
  const row = new Float64Array(2 * n + 3);
  const x = logKm(km);
  row[0] = 1;
  row[n + 1] = x;
  row[n + 2] = x * x;
  for (let i = 0; i < n; i++) {
    const value = Math.min(Math.max((features[i]! - mean[i]!) / sd[i]!, -CLIP), CLIP);
    row[i + 1] = value;
    row[n + 3 + i] = value * x * CHANGE_WITH_KM;
  }
  return row;
}

/** How many of a row's leading entries the scale uses: 1, features and log km. */
export const scaleLength = (features: number): number => features + 2;
