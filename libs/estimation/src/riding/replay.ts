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
  return { log, today: o, starts, kmPerDay: (kmBetween(log, o - year, o) + 20) / (year + 40) };
}

/**
 * Log days that `km` took: median and width over starts of this season, median and width over starts like today, and the
 * plain median. A start that has not got there yet goes on at the year's mean and counts for the part it shows.
 */
export function replayFeatures(
  { log, today, starts, kmPerDay }: Replay,
  km: number,
  horizon: number,
): number[] {
  if (starts.length === 0) {
    const days = Math.log(Math.min(Math.max(km / kmPerDay, 1), horizon));
    return [days, 1, days, 1, days];
  }
  const past = log.sums.subarray(0, today + 1);
  const points = starts.map(({ index, seen, recency, season, likeness }) => {
    const days =
      seen >= km
        ? firstReaching(past, log.sums[index]! + km) - index
        : today - index + (km - seen) / kmPerDay;
    const shown = Math.min(seen / km, 1) + 0.05;
    return {
      days: Math.log(Math.min(Math.max(days, 1), horizon)),
      inSeason: recency * season * shown,
      like: recency * (season + 0.3) * likeness * shown,
      shown,
    };
  });
  points.sort((a, b) => a.days - b.days);
  const days = points.map((point) => point.days);
  const quantiles = (weights: number[]) => LEVELS.map((p) => weightedQuantile(days, weights, p));
  const season = quantiles(points.map(({ inSeason }) => inSeason));
  const like = quantiles(points.map((point) => point.like));
  const plain = weightedQuantile(
    days,
    points.map(({ shown }) => shown),
    0.5,
  );
  return [season[1]!, season[2]! - season[0]!, like[1]!, like[2]! - like[0]!, plain];
}

/** Quantile of ascending values, read between the middles of their weights. */
function weightedQuantile(values: readonly number[], weights: readonly number[], p: number): number {
  const total = weights.reduce((sum, w) => sum + w, 0);
  let before = 0;
  let lastMiddle = 0;
  for (let i = 0; i < values.length; i++) {
    const middle = before + weights[i]! / 2;
    if (middle >= p * total) {
      if (i === 0) return values[0]!;
      const share = (p * total - lastMiddle) / (middle - lastMiddle);
      return values[i - 1]! + share * (values[i]! - values[i - 1]!);
    }
    before += weights[i]!;
    lastMiddle = middle;
  }
  return values[values.length - 1]!;
}
