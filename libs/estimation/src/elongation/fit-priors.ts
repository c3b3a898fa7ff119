import type { BikeKind, ElongationPriors, Regime } from '../types';
import { chainEvidence, ChainEvidence, momentsUnder } from './chain-evidence';
import { defaultElongationModel, PlacedReading } from './model';

/** One of the workshop's chains with its readings, in service or retired. */
export interface MeasuredChain {
  regime: Regime;
  bikeKind: BikeKind;
  readings: readonly PlacedReading[];
}

/** How far, in the log, a workshop's chains may lie from the start (by regime), and a kind of riding from its regime. */
const REGIME_SD = 0.5;
const KIND_SD = 0.25;
/** The start's log-sd counts as much as this many chains. */
const START_CHAINS = 20;
const ROUNDS = 60;

interface Cell {
  regime: Regime;
  kind: BikeKind;
  start: number;
  evidence: ChainEvidence[];
  /** Departure of the kind from its regime, in the log. */
  departure: number;
}

/**
 * What the workshop's own chains teach of wear rates: log rate of a chain = start + regime + kind within regime + its
 * own, each normal with mean 0. Expectation-maximisation for the first two and the sd of the last; what has few chains
 * stays near its regime, and that near the start. `start` is the shipped prior, not an earlier fit: chains are not
 * counted twice.
 */
export function fitElongationPriors(
  chains: readonly MeasuredChain[],
  start: ElongationPriors,
): ElongationPriors {
  const regimes = Object.keys(start.rate) as Regime[];
  const cells = regimes.map((regime) => cellsOf(regime, chains, start));
  const shifts = regimes.map(() => 0);
  let sd = start.rate[regimes[0]!].road.logSd;
  const startVariance = sd * sd;
  for (let round = 0; round < ROUNDS; round++) {
    let squares = START_CHAINS * startVariance;
    let counted = START_CHAINS;
    cells.forEach((group, r) => {
      const means = group.map((cell) => {
        const centre = cell.start + shifts[r]! + cell.departure;
        const seen = cell.evidence.map((evidence) => momentsUnder(evidence, centre, sd));
        for (const { square } of seen) squares += square;
        counted += seen.length;
        return seen.reduce((sum, { mean }) => sum + mean - cell.start, 0);
      });
      shifts[r] = settle(group, means, sd * sd);
    });
    sd = Math.sqrt(squares / counted);
  }
  return { rate: tableOf(cells, shifts, sd) };
}

function cellsOf(regime: Regime, chains: readonly MeasuredChain[], start: ElongationPriors): Cell[] {
  return (Object.keys(start.rate[regime]) as BikeKind[]).map((kind) => {
    const prior = start.rate[regime][kind];
    const evidence = chains
      .filter((chain) => chain.regime === regime && chain.bikeKind === kind && hasRun(chain))
      .map(({ readings }) => chainEvidence(readings, prior, defaultElongationModel));
    return { regime, kind, start: Math.log(prior.median), evidence, departure: 0 };
  });
}

const hasRun = ({ readings }: MeasuredChain) =>
  readings.some(({ baseline, wearKm }) => !baseline && wearKm > 0);

/** Sets the kinds' departures and returns the regime's shift: both means pulled towards 0 by their priors. */
function settle(group: Cell[], sums: readonly number[], variance: number): number {
  let shift = 0;
  for (let i = 0; i < 50; i++) {
    let [above, below] = [0, variance / REGIME_SD ** 2];
    group.forEach((cell, k) => {
      const n = cell.evidence.length;
      above += sums[k]! - n * cell.departure;
      below += n;
    });
    shift = above / below;
    group.forEach((cell, k) => {
      const n = cell.evidence.length;
      cell.departure = (sums[k]! - n * shift) / (n + variance / KIND_SD ** 2);
    });
  }
  return shift;
}

function tableOf(cells: Cell[][], shifts: readonly number[], sd: number): ElongationPriors['rate'] {
  const rows = cells.map((group, r) => [
    group[0]!.regime,
    Object.fromEntries(
      group.map(({ kind, start, departure, evidence }) => [
        kind,
        { median: Math.exp(start + shifts[r]! + departure), logSd: sd, chains: evidence.length },
      ]),
    ),
  ]);
  return Object.fromEntries(rows) as ElongationPriors['rate'];
}
