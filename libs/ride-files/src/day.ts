/** Calendar day 'YYYY-MM-DD' of an instant (epoch ms) at an offset from UTC in seconds. */
export function dayAtOffset(time: number, offsetS: number): string {
  return new Date(time + offsetS * 1000).toISOString().slice(0, 10);
}

/** Calendar day of an instant (epoch ms) in an IANA time zone. */
export function dayInZone(time: number, timeZone: string): string {
  const parts = new Intl.DateTimeFormat('en-GB', {
    timeZone,
    year: 'numeric',
    month: '2-digit',
    day: '2-digit',
  })
    .formatToParts(time)
    .reduce<Record<string, string>>((all, { type, value }) => ({ ...all, [type]: value }), {});
  return `${(parts.year ?? '').padStart(4, '0')}-${parts.month}-${parts.day}`;
}

/** Time of a file: its instant, and its own offset from UTC where it writes one (null for 'Z' or nothing). */
export interface FileTime {
  /** Epoch ms; of the wall clock as if it were UTC when zoned is false. */
  time: number;
  zoned: boolean;
  offsetS: number | null;
}

/** Reads an ISO 8601 time as GPX and TCX write it, zones with or without a colon; null when it is none. */
export function fileTime(text: string): FileTime | null {
  const iso = /^(\d{4}-\d{2}-\d{2}T\d{2}:\d{2}(?::\d{2}(?:\.\d+)?)?)(?:(Z)|([+-])(\d{2}):?(\d{2}))?$/.exec(
    text.trim(),
  );
  const wall = Date.parse(`${iso?.[1]}Z`);
  if (!iso || Number.isNaN(wall)) return null;
  if (iso[2]) return { time: wall, zoned: true, offsetS: null };
  if (!iso[3]) return { time: wall, zoned: false, offsetS: 0 };
  const offsetS = (iso[3] === '-' ? -1 : 1) * (Number(iso[4]) * 3600 + Number(iso[5]) * 60);
  return { time: wall - offsetS * 1000, zoned: true, offsetS };
}

/** Local calendar day of a start: by the file's own offset, else by the zone given, else in UTC. */
export function localDay(time: number, offsetS: number | null, timeZone: string | undefined): string {
  if (offsetS !== null) return dayAtOffset(time, offsetS);
  return timeZone === undefined ? dayAtOffset(time, 0) : dayInZone(time, timeZone);
}
