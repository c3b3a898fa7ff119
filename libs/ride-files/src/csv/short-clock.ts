import type { ShortClock } from './matching';

/** Average speeds over a whole log in metres a second between which people ride: 3 and 36 km/h (common practice, no source). */
const [SLOWEST, FASTEST] = [3 / 3.6, 36 / 3.6];

/**
 * Whether times with one colon are hours:minutes or minutes:seconds. A column that also has h:m:s means minutes
 * and seconds; otherwise the reading under which the rides have a bicycle's speed. Null when neither has, as
 * when the column tells the time of day.
 */
export function guessShortClock(rides: { time: string; distanceM: number | null }[]): ShortClock | null {
  if (rides.some(({ time }) => /^\d+:\d{2}:\d{2}/.test(time))) return 'm:s';
  const speeds = rides.flatMap(({ time, distanceM }) => {
    const clock = /^(\d+):(\d{2})$/.exec(time);
    return clock && distanceM ? [distanceM / Math.max(1, Number(clock[1]) * 60 + Number(clock[2]))] : [];
  });
  if (speeds.length === 0) return 'h:m';
  const median = speeds.sort((a, b) => a - b)[Math.floor(speeds.length / 2)] ?? 0;
  if (rideable(median / 60)) return 'h:m';
  return rideable(median) ? 'm:s' : null;
}

const rideable = (speed: number) => speed >= SLOWEST && speed <= FASTEST;
