import { DailyLog, kmBetween } from './daily-log';
import { firstReaching } from './reach';

const STEP = 7;
const YEAR = 365.25;
/** Starts of this half-life ago count half as much, days. */
const HALF_LIFE = 400;
const SEASON_SD = 30;
const OFF_SEASON = 0.1;
const STATE_SD = 0.5;
const LEVELS = [0.15, 0.5, 0.85] as const;

interface Start {
  index: number;
  /** Km from this start up to today. */
  seen: number;
  recency: number;
  season: number;
  likeness: number;
}

/**
 * What a rider's own past says: each earlier week is a start from which the log shows how long a distance took. Starts of
 * this season, and starts that followed riding like today's, weigh more.
 */
export interface Replay {
  log: DailyLog;
  /** Sums of km up to today. */
  past: Float64Array;
  today: number;
  starts: readonly Start[];
  kmPerDay: number;
}

const level = (kmPerDay: number) => Math.log(kmPerDay + 0.5);

export function replay(log: DailyLog, o: number): Replay {
  const rate = (s: number, w: number) => level(kmBetween(log, s - w, s) / Math.max(Math.min(w, s), 1));
  const month = rate(o, 28);
  const quarter = rate(o, 90);
  const starts: Start[] = [];
  for (let s = o - STEP; s >= 0; s -= STEP) {
    const age = o - s;
    const offSeason = Math.abs(((age + YEAR / 2) % YEAR) - YEAR / 2);
    const unlike = (rate(s, 28) - month) ** 2 + (rate(s, 90) - quarter) ** 2;
    starts.push({
      index: s,
      seen: log.sums[o]! - log.sums[s]!,
      recency: 0.5 ** (age / HALF_LIFE),
      season: Math.exp(-0.5 * (offSeason / SEASON_SD) ** 2) + OFF_SEASON,
      likeness: Math.exp((-0.5 * unlike) / STATE_SD ** 2) * Math.min(s / 28, 1) + 1e-3,
    });
  }
  const year = Math.min(365, o);
  return {
    log,
    past: log.sums.subarray(0, o + 1),
    today: o,
    starts,
    kmPerDay: (kmBetween(log, o - year, o) + 20) / (year + 40),
  };
}

/**
 * Log days that `km` took: median and width over starts of this season, median and width over starts like today, and the
 * plain median. A start that has not got there yet goes on at the year's mean and counts for the part it shows.
 */
export function replayFeatures(
  { log, past, today, starts, kmPerDay }: Replay,
  km: number,
  horizon: number,
): number[] {
  if (starts.length === 0) {
    const days = Math.log(Math.min(Math.max(km / kmPerDay, 1), horizon));
    return [days, 1, days, 1, days];
  }
  const n = starts.length;
  const days = new Float64Array(n);
  const shown = new Float64Array(n);
  starts.forEach(({ index, seen }, i) => {
    const taken =
      seen >= km
        ? firstReaching(past, log.sums[index]! + km) - index
        : today - index + (km - seen) / kmPerDay;
    days[i] = Math.log(Math.min(Math.max(taken, 1), horizon));
    shown[i] = Math.min(seen / km, 1) + 0.05;
  });
  const order = new Uint16Array(n).map((_, i) => i).sort((a, b) => days[a]! - days[b]!);
  const quantiles = (weight: (start: Start) => number) =>
    weightedQuantiles(
      days,
      order,
      shown.map((share, i) => share * weight(starts[i]!)),
    );
  const season = quantiles((start) => start.recency * start.season);
  const like = quantiles((start) => start.recency * (start.season + 0.3) * start.likeness);
  const plain = quantiles(() => 1);
  return [season[1]!, season[2]! - season[0]!, like[1]!, like[2]! - like[0]!, plain[1]!];
}

/** Quantiles at LEVELS of values taken in ascending order, read between the middles of their weights. */
function weightedQuantiles(values: Float64Array, order: Uint16Array, weights: Float64Array): number[] {
  const total = weights.reduce((sum, w) => sum + w, 0);
  return LEVELS.map((p) => {
    let before = 0;
    let lastMiddle = 0;
    let last = values[order[0]!]!;
    for (const i of order) {
      const middle = before + weights[i]! / 2;
      if (middle >= p * total) {
        const share = before === 0 ? 0 : (p * total - lastMiddle) / (middle - lastMiddle);
        return last + share * (values[i]! - last);
      }
      before += weights[i]!;
      lastMiddle = middle;
      last = values[i]!;
    }
    return last;
  });
}
