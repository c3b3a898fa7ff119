import { weightedBand } from '../math/weighted';
import type { Band, Reading } from '../types';
import { methodErrors } from './methods';
import { readingLikelihood, soundLikelihood, WRONG_SHARE } from './reading-likelihood';

/** A reading with the wear km the chain had when it was taken. */
export interface PlacedReading extends Reading {
  wearKm: number;
}

export interface RatePrior {
  /** % per 1,000 wear km. */
  median: number;
  logSd: number;
}

/** Posterior of a chain's rate and run-in on a grid of atoms, and what follows from it. */
export interface ElongationPosterior {
  rates: readonly number[];
  runIns: readonly number[];
  weights: readonly number[];
  rate: Band;
  /** True elongation at wear km x, %. */
  elongationAt(wearKm: number): Band;
  /** Wear km from `wearKm` on until the limit, as equally ordered atoms with weights: [km, weight]. */
  wearKmLeft(wearKm: number, limitPct: number): { values: number[]; weights: readonly number[] };
  chancePast(wearKm: number, limitPct: number): number;
  /** Chance that a reading is simply wrong, by reading id. */
  doubt: ReadonlyMap<string, number>;
}

/** Quick bedding-in of a new chain, %: under 0.1 in its first hours (Tsubaki, Complete Guide to Chain, 2.2.4, read). */
const RUN_IN = { mean: 0.03, sd: 0.02 };
const RATE_NODES = 61;
const RUN_IN_NODES = [-2, -1, 0, 1, 2];
const OFFSET_NODES = Array.from({ length: 17 }, (_, i) => -3 + (6 * i) / 16);

const bell = (z: number) => Math.exp(-0.5 * z * z);

/** Readings that share one offset: those of one gauge on one chain. */
function byGauge(readings: readonly PlacedReading[]): PlacedReading[][] {
  const groups = new Map<string, PlacedReading[]>();
  for (const reading of readings) {
    const key = reading.gauge ?? reading.method;
    groups.set(key, [...(groups.get(key) ?? []), reading]);
  }
  return [...groups.values()];
}

/** True elongation a model gives for a reading: a baseline is taken before the first km, so it shows the offset alone. */
const truth = (reading: PlacedReading, runIn: number, rate: number) =>
  reading.baseline ? 0 : runIn + (rate * reading.wearKm) / 1000;

/** Chance of a gauge's readings with its offset summed out. */
function gaugeLikelihood(readings: readonly PlacedReading[], runIn: number, rate: number): number {
  const { offset, offsetSd } = methodErrors[readings[0]!.method];
  let sum = 0;
  for (const z of OFFSET_NODES) {
    let product = bell(z);
    for (const reading of readings) {
      product *= readingLikelihood(reading, truth(reading, runIn, rate) + offset + z * offsetSd);
    }
    sum += product;
  }
  return sum;
}

/**
 * Posterior of e(x) = run-in + rate · x/1000 given readings by any method. Offsets are shared by a gauge's readings and
 * summed out; readings may be wrong with a small chance, so that one that contradicts the others weighs less.
 */
export function elongationPosterior(
  readings: readonly PlacedReading[],
  prior: RatePrior,
): ElongationPosterior {
  const gauges = byGauge(readings);
  const rates: number[] = [];
  const runIns: number[] = [];
  const logs: number[] = [];
  for (let i = 0; i < RATE_NODES; i++) {
    const z = -4 + (8 * i) / (RATE_NODES - 1);
    const rate = prior.median * Math.exp(prior.logSd * z);
    for (const node of RUN_IN_NODES) {
      const runIn = Math.max(RUN_IN.mean + RUN_IN.sd * node, 0);
      rates.push(rate);
      runIns.push(runIn);
      let log = -0.5 * z * z - 0.5 * node * node;
      for (const gauge of gauges) log += Math.log(gaugeLikelihood(gauge, runIn, rate) + Number.MIN_VALUE);
      logs.push(log);
    }
  }
  const top = Math.max(...logs);
  const weights = logs.map((log) => Math.exp(log - top));
  const total = weights.reduce((sum, w) => sum + w, 0);
  const elongations = (wearKm: number) => rates.map((rate, i) => runIns[i]! + (rate * wearKm) / 1000);
  return {
    rates,
    runIns,
    weights,
    rate: weightedBand(rates, weights),
    elongationAt: (wearKm) => weightedBand(elongations(wearKm), weights),
    wearKmLeft: (wearKm, limitPct) => ({
      values: rates.map((rate, i) => (1000 * (limitPct - runIns[i]!)) / rate - wearKm),
      weights,
    }),
    chancePast: (wearKm, limitPct) =>
      elongations(wearKm).reduce((sum, e, i) => sum + (e >= limitPct ? weights[i]! : 0), 0) / total,
    doubt: new Map(readings.map((reading) => [reading.id, wrongChance(reading, rates, runIns, weights)])),
  };
}

/** Chance that a reading is wrong, averaged over the posterior with the gauge's offset at its mean and ends. */
function wrongChance(reading: PlacedReading, rates: number[], runIns: number[], weights: number[]): number {
  const { offset, offsetSd } = methodErrors[reading.method];
  let sound = 0;
  let all = 0;
  rates.forEach((rate, i) => {
    for (const z of [-1, 0, 1]) {
      const shown = truth(reading, runIns[i]!, rate) + offset + z * offsetSd;
      const weight = weights[i]! * bell(z);
      const robust = readingLikelihood(reading, shown);
      sound +=
        (weight * (1 - WRONG_SHARE) * soundLikelihood(reading, shown)) / Math.max(robust, Number.MIN_VALUE);
      all += weight;
    }
  });
  return all > 0 ? 1 - sound / all : 0;
}
