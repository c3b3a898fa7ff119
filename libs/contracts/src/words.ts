import type { DistanceUnit } from './accounts';
import type { DueWindow, Reason } from './estimates';

const part = (day: string, options: Intl.DateTimeFormatOptions) =>
  new Intl.DateTimeFormat('en-GB', { ...options, timeZone: 'UTC' }).format(new Date(`${day}T00:00:00Z`));

/** '17 March', with the year where it is not this one. */
export function dayWords(day: string, today: string): string {
  const year = day.slice(0, 4) === today.slice(0, 4) ? {} : ({ year: 'numeric' } as const);
  return part(day, { day: 'numeric', month: 'long', ...year });
}

/** '11–24 March' or '28 March – 4 April'. */
export function spanWords(from: string, to: string, today: string): string {
  if (from === to) return dayWords(from, today);
  if (from.slice(0, 7) === to.slice(0, 7)) return `${Number(from.slice(8))}–${dayWords(to, today)}`;
  return `${dayWords(from, today)} – ${dayWords(to, today)}`;
}

/** A window as a sentence part: 'likely 11–24 March, most likely 17 March'. */
export function windowWords(
  { p10, p50, p90 }: Pick<DueWindow, 'p10' | 'p50' | 'p90'>,
  today: string,
): string {
  if (p10 === null) return 'not within the next two years';
  if (p90 !== null && p90 <= today) return 'due now';
  const from = p10 <= today ? today : p10;
  if (from === p90) return `most likely ${dayWords(p90, today)}`;
  const median =
    p50 === null ? '' : p50 <= today ? ', most likely now' : `, most likely ${dayWords(p50, today)}`;
  if (p90 === null) return `from ${dayWords(from, today)} on${median}`;
  return `likely ${p10 <= today ? 'between now and ' + dayWords(p90, today) : spanWords(from, p90, today)}${median}`;
}

const NUMBERS = ['no', 'one', 'two', 'three', 'four', 'five', 'six', 'seven', 'eight', 'nine', 'ten'];
const count = (n = 1, one: string, many: string) => `${NUMBERS[n] ?? n} ${n === 1 ? one : many}`;
/** Kilometres as this reader counts them. */
type Far = (km: number | undefined) => string;
/** The statute mile: 1.609344 km exactly (international yard and pound agreement, 1959; memory). */
const KM_IN = { km: 1, mi: 1.609344 } as const;
const farIn =
  (unit: DistanceUnit): Far =>
  (km = 0) =>
    `${Math.round(km / KM_IN[unit])} ${unit}`;

const SENTENCES = {
  'first-estimate': 'This is the first estimate, from what is known so far.',
  'calendar-limit':
    'The calendar decides: a treatment is redone after so many days, however little was ridden.',
  'quiet-log': 'The log has gone quiet, so the riding ahead is a guess.',
  'new-chain': 'The chain is new.',
} as const;
type Cause = Exclude<Reason['code'], keyof typeof SENTENCES>;

/** What happened, without what it did to the window. */
const CAUSES: Record<Cause, (data: Reason['data'], far: Far) => string> = {
  'riding-more': (data, far) =>
    `More riding than usual (${far(data.km)} instead of about ${far(data.usual)})`,
  'riding-less': (data, far) =>
    `Less riding than usual (${far(data.km)} instead of about ${far(data.usual)})`,
  'wet-rides': (data, far) =>
    `${count(data.rides, 'wet ride', 'wet rides')} (${far(data.km)}, which count for more)`,
  'rough-rides': (data, far) =>
    `${count(data.rides, 'ride', 'rides')} off the road (${far(data.km)}, which count for more)`,
  reading: (data) => count(data.readings, 'new chain-checker reading', 'new chain-checker readings'),
  treatment: () => 'The treatment that was given',
  'planned-riding': (data, far) => `${far(data.km)} of planned riding`,
  'unlogged-distance': (data, far) => `${far(data.km)} on the odometer that nobody logged`,
};

const isWhole = (code: Reason['code']): code is keyof typeof SENTENCES => code in SENTENCES;
const capital = (text: string) => text.charAt(0).toUpperCase() + text.slice(1);

/** One reason as a sentence: 'Two wet rides (74 km, which count for more) moved it six days earlier.' */
export function reasonWords({ code, days, data }: Reason, unit: DistanceUnit = 'km'): string {
  if (isWhole(code)) return SENTENCES[code];
  const cause = capital(CAUSES[code](data, farIn(unit)));
  const size = Math.abs(Math.round(days));
  if (size === 0) return `${cause} did not move it.`;
  return `${cause} moved it ${count(size, 'day', 'days')} ${days < 0 ? 'earlier' : 'later'}.`;
}
