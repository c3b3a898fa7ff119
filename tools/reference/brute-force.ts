import { jStat } from 'jstat';
import { methodErrors } from '../../libs/estimation/src/elongation/methods';
import type { PlacedReading } from '../../libs/estimation/src/elongation/model';
import type { GeneratedChain } from './generate-chain';

/** One point of the plain grid over rate and run-in, with its posterior weight. */
export interface Atom {
  rate: number;
  runIn: number;
  weight: number;
  /** The point stands for rates from rate / halfStep to rate · halfStep. */
  halfStep: number;
}

const WRONG_SHARE = 0.03;
const RUN_IN = { log: Math.log(0.025), sd: 0.5 };

const RUN_INS = 26;
const OFFSETS = 37;
/** Rates looked at first, six prior sd either way, and rates about that many of which then share the heavy part. */
const LOOK = { rates: 160, runIns: 5 };
const FINE_RATES = 120;

/** Log rates from low to high that one point stands for. */
interface Cell {
  low: number;
  high: number;
}

/**
 * The posterior as the plainest thing that can be right: for rates and run-ins by the thousand every gauge's offset is
 * summed over, every reading's chance being computed anew. Shares with the product only the numbers of the model.
 */
export function bruteForce(chain: GeneratedChain): Atom[] {
  const { median, logSd } = chain.prior;
  const wide = { low: Math.log(median) - 6 * logSd, high: Math.log(median) + 6 * logSd };
  const cells = divide(wide, LOOK.rates);
  const heights = cells.map((cell) =>
    Math.max(...atoms(chain, [cell], LOOK.runIns).map(({ weight }) => weight)),
  );
  const top = Math.max(...heights);
  const heavy = heights.filter((height) => height > 1e-4 * top).length;
  const fine = cells.flatMap((cell, i) => {
    if (heights[i]! > 1e-4 * top) return divide(cell, Math.ceil(FINE_RATES / heavy));
    return heights[i]! > 1e-9 * top ? [cell] : [];
  });
  return atoms(chain, fine, RUN_INS);
}

const divide = ({ low, high }: Cell, n: number): Cell[] =>
  Array.from({ length: n }, (_, i) => ({
    low: low + (i * (high - low)) / n,
    high: low + ((i + 1) * (high - low)) / n,
  }));

/** Midpoints of an even division. */
const midpoints = (low: number, high: number, n: number): number[] =>
  Array.from({ length: n }, (_, i) => low + ((i + 0.5) * (high - low)) / n);

function atoms({ prior, readings }: GeneratedChain, cells: readonly Cell[], runIns: number): Atom[] {
  const gauges = new Map<string, PlacedReading[]>();
  for (const reading of readings) {
    const key = `${reading.method} ${reading.gauge}`;
    gauges.set(key, [...(gauges.get(key) ?? []), reading]);
  }
  const result: Atom[] = [];
  for (const logRunIn of midpoints(RUN_IN.log - 5 * RUN_IN.sd, RUN_IN.log + 5 * RUN_IN.sd, runIns)) {
    for (const { low, high } of cells) {
      const logRate = (low + high) / 2;
      const [rate, runIn] = [Math.exp(logRate), Math.exp(logRunIn)];
      let weight =
        (high - low) *
        jStat.normal.pdf(logRate, Math.log(prior.median), prior.logSd) *
        jStat.normal.pdf(logRunIn, RUN_IN.log, RUN_IN.sd);
      for (const group of gauges.values()) weight *= overOffsets(group, rate, runIn);
      result.push({ rate, runIn, weight, halfStep: Math.exp((high - low) / 2) });
    }
  }
  return result;
}

function overOffsets(readings: readonly PlacedReading[], rate: number, runIn: number): number {
  const { offset, offsetSd } = methodErrors[readings[0]!.method];
  let sum = 0;
  for (const z of midpoints(-4.5, 4.5, OFFSETS)) {
    let product = jStat.normal.pdf(z, 0, 1);
    for (const reading of readings) {
      const truth = reading.baseline ? 0 : runIn + (rate * reading.wearKm) / 1000;
      product *= chance(reading, truth + offset + z * offsetSd);
    }
    sum += product;
  }
  return sum;
}

/** Robust chance of one reading; a wrong number falls anywhere on 1.5 %, a wrong go/no-go is a coin's toss. */
function chance({ method, values, lower, upper }: PlacedReading, shown: number): number {
  const { noiseSd } = methodErrors[method];
  if (values) {
    const worst = Math.max(...values);
    const others = values.length > 1 ? jStat.normal.cdf(worst, shown, noiseSd) ** (values.length - 1) : 1;
    const density = values.length * jStat.normal.pdf(worst, shown, noiseSd) * others;
    return (1 - WRONG_SHARE) * density + WRONG_SHARE / 1.5;
  }
  const below = upper === undefined ? 1 : jStat.normal.cdf(upper, shown, noiseSd);
  const under = lower === undefined ? 0 : jStat.normal.cdf(lower, shown, noiseSd);
  return (1 - WRONG_SHARE) * (below - under) + WRONG_SHARE * 0.5;
}

/** Something that follows from rate and run-in and moves one way with the rate. */
export type Consequence = (rate: number, runIn: number) => number;

/** Chance that a consequence lies below `value`: every point stands for its cell, over which the weight is even. */
export function chanceBelow(all: readonly Atom[], of: Consequence, value: number): number {
  let [below, total] = [0, 0];
  for (const { rate, runIn, weight, halfStep } of all) {
    const ends = [of(rate / halfStep, runIn), of(rate * halfStep, runIn)];
    const [low, high] = [Math.min(...ends), Math.max(...ends)];
    total += weight;
    if (high <= value) below += weight;
    else if (low < value) below += (weight * (value - low)) / (high - low);
  }
  return below / total;
}

/** The value below which a consequence lies with chance p, by halving. */
export function quantile(all: readonly Atom[], of: Consequence, p: number): number {
  const values = all.map(({ rate, runIn }) => of(rate, runIn));
  let low = values.reduce((least, value) => Math.min(least, value), Infinity);
  let high = values.reduce((most, value) => Math.max(most, value), -Infinity);
  for (let i = 0; i < 40; i++) {
    const middle = (low + high) / 2;
    if (chanceBelow(all, of, middle) < p) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
}
