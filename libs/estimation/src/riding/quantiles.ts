import { LEVELS } from '../types';
import { MAX_LOG_DAYS } from './crps-loss';
import { designRow } from './design';
import type { Coefficients } from './model';

/** Days to reach `km` at each of LEVELS, from the features of a log (those for this distance among them). */
export function quantilesAt(model: Coefficients, features: readonly number[], km: number): number[] {
  const row = designRow(features, km, model);
  let location = 0;
  for (let i = 0; i < row.length; i++) location += row[i]! * model.location[i]!;
  let logScale = 0;
  for (let i = 0; i < model.scale.length; i++) logScale += row[i]! * model.scale[i]!;
  const scale = Math.exp(Math.min(Math.max(logScale, -3), 3));
  const median = model.z[LEVELS.length >> 1]!;
  return model.z.map((z) => {
    const logDays = location + scale * (median + model.spread * (z - median));
    return Math.max(Math.exp(Math.min(logDays, MAX_LOG_DAYS)), 1);
  });
}
