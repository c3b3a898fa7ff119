import { maximise } from '../math/maximise';
import type { LifeModel } from '../types';
import { LifeObservation, lifeBounds, mistakenChance, tells } from './rider-life';
import { riderLogLikelihood, SeenLife } from './rider-likelihood';

type Kind = LifeObservation['kind'];

/** What each rider's treatments were found like. */
export type RiderLives = readonly LifeObservation[];

/** How far a workshop's lives may lie from those it starts with, sd of the logs: weak beside a season's observations. */
const PRIOR_SD = { median: 0.5, within: 0.25, between: 0.4 };

export interface LifeFit {
  model: LifeModel;
  /** Standard errors: of each kind's log median, then of the log sds within and between riders. */
  standardErrors: { kinds: Partial<Record<Kind, number>>; logWithin: number; logBetween: number };
}

/**
 * Lives of treatments by kind from everything a workshop has found on arrival: log-normal, interval-censored, with an
 * effect of the rider summed out, by maximum likelihood with a weak prior about `start`; a look that no life explains
 * counts for little. Kinds never seen keep theirs.
 */
export function fitLifeWithErrors(riders: readonly RiderLives[], start: LifeModel): LifeFit {
  const told = riders.map((seen) => seen.filter(tells)).filter((seen) => seen.length > 0);
  const counts = new Map<Kind, number>();
  for (const { kind } of told.flat()) counts.set(kind, (counts.get(kind) ?? 0) + 1);
  const kinds = [...counts.keys()].sort();
  const seen = told.map((observations) => observations.map((o) => seenLife(o, kinds, start)));
  const middle = Float64Array.from([
    ...kinds.map((kind) => Math.log(start.kinds[kind].median)),
    Math.log(start.logSdWithin),
    Math.log(start.logSdBetween),
  ]);
  const sd = [...kinds.map(() => PRIOR_SD.median), PRIOR_SD.within, PRIOR_SD.between];
  const { at, standardErrors } = maximise((parameters, gradient) => {
    gradient.fill(0);
    let log = 0;
    for (const lives of seen) log += riderLogLikelihood(lives, parameters, gradient);
    parameters.forEach((x, i) => {
      const z = (x - middle[i]!) / sd[i]!;
      log -= 0.5 * z * z;
      gradient[i]! -= z / sd[i]!;
    });
    return log;
  }, middle);
  const learned = kinds.map((kind, i) => [
    kind,
    { median: Math.exp(at[i]!), observations: counts.get(kind)!, logSe: standardErrors[i]! },
  ]);
  return {
    model: {
      kinds: { ...start.kinds, ...(Object.fromEntries(learned) as Partial<LifeModel['kinds']>) },
      logSdWithin: Math.exp(at[kinds.length]!),
      logSdBetween: Math.exp(at[kinds.length + 1]!),
    },
    standardErrors: {
      kinds: Object.fromEntries(kinds.map((kind, i) => [kind, standardErrors[i]!])),
      logWithin: standardErrors[kinds.length]!,
      logBetween: standardErrors[kinds.length + 1]!,
    },
  };
}

/** The life model that a workshop's observations teach, one list a rider. */
export const fitLife = (riders: readonly RiderLives[], start: LifeModel): LifeModel =>
  fitLifeWithErrors(riders, start).model;

function seenLife(
  { kind, arrival, lubeKm }: LifeObservation,
  kinds: readonly Kind[],
  start: LifeModel,
): SeenLife {
  const [logLow, logHigh] = lifeBounds(arrival, lubeKm).map(Math.log) as [number, number];
  const mistaken = mistakenChance(logLow, logHigh, Math.log(start.kinds[kind].median));
  return { kind: kinds.indexOf(kind), logLow, logHigh, mistaken };
}
