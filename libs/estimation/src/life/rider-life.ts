import { normalQuantile } from '../math/normal';
import { tabledCdf } from '../math/normal-table';
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

/** Whether anything was seen of the life. */
export const tells = ({ lubeKm, arrival }: LifeObservation): boolean => lubeKm > 0 && arrival !== 'not-seen';

/** One look in fifty is not what it seems: a treatment in between was never recorded, or was seen wrongly (judgement). */
const MISTAKEN = 0.02;
/** Sd of the log of the lives that mistaken looks suggest, about the kind's median (judgement). */
const MISTAKEN_SD = 1.5;

/** Chance of a look with these log bounds, `sound` where it is what it seems; `mistaken` is the rest. */
export const robust = (sound: number, mistaken: number): number => (1 - MISTAKEN) * sound + mistaken;

/** Weight of a look being mistaken: MISTAKEN times the chance of its bounds among mistaken ones. */
export function mistakenChance(logLow: number, logHigh: number, logMedian: number): number {
  const level = (log: number) => tabledCdf((log - logMedian) / MISTAKEN_SD);
  return MISTAKEN * (level(logHigh) - level(logLow));
}

/** Whether a look is more likely mistaken than a life that this model can believe of some rider. */
export function isDoubtful(look: LifeObservation, { kinds, logSdWithin, logSdBetween }: LifeModel): boolean {
  if (!tells(look)) return false;
  const [low, high] = lifeBounds(look.arrival, look.lubeKm).map(Math.log) as [number, number];
  const median = Math.log(kinds[look.kind].median);
  const sd = Math.hypot(logSdWithin, logSdBetween);
  const sound = tabledCdf((high - median) / sd) - tabledCdf((low - median) / sd);
  const mistaken = mistakenChance(low, high, median);
  return mistaken > robust(sound, mistaken) - mistaken;
}

const NODES = 41;
/** Nodes lie within this many sd between riders of the middle. */
const REACH = 4;
/** Keeps a life that the model thinks impossible from vanishing. */
const LEAST_CHANCE = 1e-12;

/** The life of a treatment of `kind` for a rider whose earlier ones ended as observed: posterior of the rider's effect. */
export function riderLife(
  kind: LifeObservation['kind'],
  seen: readonly LifeObservation[],
  model: LifeModel,
): LifeDistribution {
  const { logSdWithin: within, logSdBetween: between } = model;
  const step = (2 * REACH) / (NODES - 1);
  const logs = Float64Array.from({ length: NODES }, (_, i) => -0.5 * (-REACH + i * step) ** 2);
  for (const observation of seen) {
    if (!tells(observation)) continue;
    const [low, high] = lifeBounds(observation.arrival, observation.lubeKm);
    const [logLow, logHigh] = [Math.log(low), Math.log(high)];
    const middle = Math.log(model.kinds[observation.kind].median);
    const mean = middle - REACH * between;
    const from = (logLow - mean) / within;
    const to = (logHigh - mean) / within;
    const mistaken = mistakenChance(logLow, logHigh, middle);
    const shift = (step * between) / within;
    for (let i = 0; i < NODES; i++) {
      const sound = tabledCdf(to - i * shift) - tabledCdf(from - i * shift);
      logs[i]! += Math.log(Math.max(robust(sound, mistaken), LEAST_CHANCE));
    }
  }
  const { mean, variance } = moments(logs, (i) => between * (-REACH + i * step));
  return { logMean: Math.log(model.kinds[kind].median) + mean, logSd: Math.sqrt(within ** 2 + variance) };
}

function moments(logs: Float64Array, valueAt: (i: number) => number): { mean: number; variance: number } {
  const top = logs.reduce((most, log) => Math.max(most, log), -Infinity);
  let [total, sum, squares] = [0, 0, 0];
  for (let i = 0; i < logs.length; i++) {
    const w = Math.exp(logs[i]! - top);
    total += w;
    sum += w * valueAt(i);
    squares += w * valueAt(i) ** 2;
  }
  const mean = sum / total;
  return { mean, variance: Math.max(squares / total - mean * mean, 0) };
}

/** Quantile of a life, lube km. */
export function lifeQuantile({ logMean, logSd }: LifeDistribution, p: number): number {
  return Math.exp(logMean + logSd * normalQuantile(p));
}
