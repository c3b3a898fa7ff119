import { LEVELS } from '../types';
import type { Objective } from './lbfgs';

export interface Lesson {
  row: Float64Array;
  days: number;
  horizon: number;
  weight: number;
}

/** Ridge: each coefficient is drawn to its centre with its own strength. */
export interface Ridge {
  centre: Float64Array;
  strength: Float64Array;
}

export const MAX_LOG_DAYS = 9;

// Taken once: looked up in the innermost loop they would cost more than they do.
const { exp, max, min } = Math;
const levels = Float64Array.from(LEVELS);
const levelCount = levels.length;
const mostLogDays = MAX_LOG_DAYS;

/**
 * Mean pinball loss over LEVELS (half the CRPS), in days capped at each lesson's horizon, plus the ridge; x holds
 * the location's coefficients, the scale's without its intercept, and z.
 */
export function crpsObjective(
  lessons: readonly Lesson[],
  scaleSize: number,
  { centre, strength }: Ridge,
): Objective {
  const size = lessons[0]!.row.length;
  const total = lessons.reduce((sum, { weight, days }) => sum + weight * days, 0) * LEVELS.length;
  const zAt = size + scaleSize - 1;
  return (x, gradient) => {
    gradient.fill(0);
    let loss = 0;
    for (const { row, days, horizon, weight } of lessons) {
      let location = 0;
      for (let i = 0; i < size; i++) location += row[i]! * x[i]!;
      let logScale = 0;
      for (let i = 1; i < scaleSize; i++) logScale += row[i]! * x[size + i - 1]!;
      const scale = exp(min(max(logScale, -3), 3));
      let gLocation = 0;
      let gScale = 0;
      for (let l = 0; l < levelCount; l++) {
        const z = x[zAt + l]!;
        const level = levels[l]!;
        const q = exp(min(max(location + scale * z, -2), mostLogDays));
        const miss = days - min(q, horizon);
        loss += weight * (miss >= 0 ? level * miss : (level - 1) * miss);
        if (q >= horizon || miss === 0) continue;
        const g = weight * q * (miss > 0 ? -level : 1 - level);
        gLocation += g;
        gScale += g * z * scale;
        gradient[zAt + l]! += g * scale;
      }
      for (let i = 0; i < size; i++) gradient[i]! += gLocation * row[i]!;
      for (let i = 1; i < scaleSize; i++) gradient[size + i - 1]! += gScale * row[i]!;
    }
    for (let i = 0; i < gradient.length; i++) gradient[i]! /= total;
    let value = loss / total;
    for (let i = 0; i < gradient.length; i++) {
      const off = x[i]! - centre[i]!;
      value += (strength[i]! * off ** 2) / 2;
      gradient[i]! += strength[i]! * off;
    }
    return value;
  };
}
