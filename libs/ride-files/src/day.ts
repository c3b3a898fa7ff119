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

/** Reads an ISO 8601 time as GPX and TCX write it; null when it is none. */
export function fileTime(text: string): FileTime | null {
  const iso = /^(\d{4}-\d{2}-\d{2}T\d{2}:\d{2}(?::\d{2}(?:\.\d+)?)?)(Z|[+-]\d{2}:\d{2})?$/.exec(text.trim());
  if (!iso) return null;
  const zone = iso[2];
  const time = Date.parse(`${iso[1]}${zone ?? 'Z'}`);
  if (Number.isNaN(time)) return null;
  if (zone === undefined) return { time, zoned: false, offsetS: 0 };
  if (zone === 'Z') return { time, zoned: true, offsetS: null };
  const sign = zone.startsWith('-') ? -1 : 1;
  return {
    time,
    zoned: true,
    offsetS: sign * (Number(zone.slice(1, 3)) * 3600 + Number(zone.slice(4, 6)) * 60),
  };
}

/** Local calendar day of a start: by the file's own offset, else by the zone given, else in UTC. */
export function localDay(time: number, offsetS: number | null, timeZone: string | undefined): string {
  if (offsetS !== null) return dayAtOffset(time, offsetS);
  return timeZone === undefined ? dayAtOffset(time, 0) : dayInZone(time, timeZone);
}
