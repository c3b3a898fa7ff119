import { DailyLog, kmBetween } from './daily-log';

const YEAR = 364;
const RATE_WINDOWS = [7, 14, 28, 56, 90, 180, 365, 730];
const HABIT_WINDOWS = [28, 90, 365];
const SEASON_WINDOWS = [28, 90, 180];

const level = (kmPerDay: number) => Math.log(kmPerDay + 0.5);

/**
 * What the log up to (and without) day index `o` says of the riding ahead: rates over windows, how often and how far,
 * the pause under way, the same weeks of earlier years, season, age, and how uneven the weeks are.
 */
export function logFeatures(log: DailyLog, o: number): number[] {
  const all = kmBetween(log, 0, o) / Math.max(o, 1);
  const rates = RATE_WINDOWS.map((w) => level(kmBetween(log, o - w, o) / Math.max(Math.min(w, o), 1)));
  const season = ((log.first + o) % 365.2425) * ((2 * Math.PI) / 365.2425);
  return [
    ...rates,
    level(all),
    Math.log1p(pause(log, o)),
    ...HABIT_WINDOWS.map((w) => rideDayShare(log, o, w)),
    Math.log(meanRide(log, o) + 1),
    ...SEASON_WINDOWS.flatMap((w) => [
      level(sameWeeksAhead(log, o, w) ?? all),
      level(sameWeeksBefore(log, o, w) ?? all),
    ]),
    o >= YEAR ? 1 : 0,
    Math.sin(season),
    Math.cos(season),
    Math.sin(2 * season),
    Math.cos(2 * season),
    Math.log(Math.max(o, 7)),
    ...weekShape(log, o, 13),
    ...weekShape(log, o, 52),
    Math.log1p(longestPause(log, o)),
  ];
}

/** Days since the last ride before day `o`. */
export function pause({ rideDays }: DailyLog, o: number): number {
  let i = o;
  while (i > 0 && rideDays[i - 1] === rideDays[o]) i--;
  return o - i;
}

function rideDayShare({ rideDays }: DailyLog, o: number, w: number): number {
  const from = Math.max(o - w, 0);
  return (rideDays[o]! - rideDays[from]!) / Math.max(o - from, 1);
}

/** Mean km of the last twenty ride days. */
function meanRide({ km, rideDays }: DailyLog, o: number): number {
  let sum = 0;
  let count = 0;
  for (let i = o - 1; i >= 0 && count < 20 && rideDays[i + 1]! > 0; i--) {
    if (km[i]! <= 0) continue;
    sum += km[i]!;
    count++;
  }
  return count > 0 ? sum / count : 0;
}

/** Km a day in the `w` days that followed this date in up to three earlier years, the nearer weighing more. */
function sameWeeksAhead(log: DailyLog, o: number, w: number): number | undefined {
  let sum = 0;
  let weights = 0;
  for (let year = 1; year <= 3 && o - YEAR * year >= 0; year++) {
    const from = o - YEAR * year;
    const to = Math.min(from + w, o);
    const weight = 0.6 ** (year - 1);
    sum += (weight * kmBetween(log, from, to)) / (to - from);
    weights += weight;
  }
  return weights > 0 ? sum / weights : undefined;
}

/** Km a day in the `w` days before this date in up to three earlier years. */
function sameWeeksBefore(log: DailyLog, o: number, w: number): number | undefined {
  let sum = 0;
  let count = 0;
  for (let year = 1; year <= 3 && o - YEAR * year >= 28; year++) {
    const to = o - YEAR * year;
    sum += kmBetween(log, to - w, to) / Math.min(w, to);
    count++;
  }
  return count > 0 ? sum / count : undefined;
}

/** Share of weeks without riding, and coefficient of variation of weekly km, over the last `n` weeks. */
function weekShape(log: DailyLog, o: number, n: number): [number, number] {
  const weeks: number[] = [];
  for (let i = 0; i < n && o - 7 * i - 7 >= 0; i++) weeks.push(kmBetween(log, o - 7 * i - 7, o - 7 * i));
  if (weeks.length === 0) return [0, 1];
  const mean = weeks.reduce((sum, km) => sum + km, 0) / weeks.length;
  const variance = weeks.reduce((sum, km) => sum + (km - mean) ** 2, 0) / weeks.length;
  return [weeks.filter((km) => km === 0).length / weeks.length, Math.sqrt(variance) / (mean + 1)];
}

/** Longest run of days without a ride in the last year, the one under way included. */
function longestPause({ km }: DailyLog, o: number): number {
  let longest = 0;
  let run = 1;
  for (let i = Math.max(o - 365, 0); i < o; i++) {
    run = km[i]! > 0 ? 1 : run + 1;
    if (run > longest) longest = run;
  }
  return longest;
}
