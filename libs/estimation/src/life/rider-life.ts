import { normalCdf, normalQuantile } from '../math/normal';
import type { ArrivalCondition, LifeModel, TreatmentKind } from '../types';

/** A treatment's life is only ever seen as a bound: what the mechanic found after `lubeKm`. */
export interface LifeObservation {
  kind: Exclude<TreatmentKind, 'new-chain'>;
  lubeKm: number;
  arrival: ArrivalCondition;
}

/** Log-normal life of one rider's next treatment, lube km. */
export interface LifeDistribution {
  logMean: number;
  logSd: number;
}

/** Where the life lies, in lube km, given the condition on arrival: quiet > u, dry <= u, turning 0.85 u to 1.1 u. */
export function lifeBounds(arrival: ArrivalCondition, u: number): [low: number, high: number] {
  if (arrival === 'quiet') return [u, Infinity];
  if (arrival === 'dry') return [0, u];
  return arrival === 'turning' ? [0.85 * u, 1.1 * u] : [0, Infinity];
}

const NODES = 61;

/** The life of a treatment of `kind` for a rider whose earlier ones ended as observed: posterior of the rider's effect. */
export function riderLife(
  kind: LifeObservation['kind'],
  seen: readonly LifeObservation[],
  model: LifeModel,
): LifeDistribution {
  const { logSdWithin: within, logSdBetween: between } = model;
  const effects = Array.from({ length: NODES }, (_, i) => between * (-4 + (8 * i) / (NODES - 1)));
  const weights = effects.map((effect) => {
    let log = -0.5 * (effect / between) ** 2;
    for (const { kind: was, lubeKm, arrival } of seen) {
      if (lubeKm <= 0 || arrival === 'not-seen') continue;
      const [low, high] = lifeBounds(arrival, lubeKm);
      const mean = Math.log(model.kinds[was].median) + effect;
      const cdf = (x: number) => (x <= 0 ? 0 : normalCdf((Math.log(x) - mean) / within));
      log += Math.log(Math.max(cdf(high) - cdf(low), 1e-300));
    }
    return log;
  });
  const top = Math.max(...weights);
  let total = 0;
  let sum = 0;
  let squares = 0;
  weights.forEach((log, i) => {
    const w = Math.exp(log - top);
    total += w;
    sum += w * effects[i]!;
    squares += w * effects[i]! ** 2;
  });
  const mean = sum / total;
  const variance = Math.max(squares / total - mean * mean, 0);
  return { logMean: Math.log(model.kinds[kind].median) + mean, logSd: Math.sqrt(within ** 2 + variance) };
}

/** Quantile of a life, lube km. */
export function lifeQuantile({ logMean, logSd }: LifeDistribution, p: number): number {
  return Math.exp(logMean + logSd * normalQuantile(p));
}
