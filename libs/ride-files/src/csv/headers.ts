import type { CsvField, DistanceUnit, TimeUnit } from './matching';

/** Header words of each field, lower case, without units; English first, then common neighbours of it. */
const words: Record<CsvField, string[]> = {
  date: ['date', 'day', 'ride date', 'datum', 'fecha', 'data', 'dato'],
  startTime: ['start', 'start time', 'started', 'started at', 'time of day', 'clock'],
  distance: [
    'distance',
    'dist',
    'length',
    'km',
    'kms',
    'kilometres',
    'kilometers',
    'mi',
    'miles',
    'm',
    'metre',
    'meter',
    'metres',
    'meters',
    'distanz',
    'strecke',
    'distancia',
    'afstand',
    'distanza',
  ],
  movingTime: [
    'moving time',
    'moving',
    'ride time',
    'riding time',
    'time',
    'duration',
    'dauer',
    'fahrzeit',
    'durée',
    'duree',
    'tiempo',
  ],
  elapsedTime: ['elapsed time', 'elapsed', 'total time'],
  surface: ['surface', 'ground', 'terrain'],
  weather: ['weather', 'conditions', 'condition', 'wetter'],
  indoor: ['indoor', 'indoors', 'trainer', 'inside'],
  sport: ['sport', 'type', 'activity', 'activity type', 'kind'],
};

const distanceUnits: Record<string, DistanceUnit> = {
  km: 'km',
  kms: 'km',
  kilometre: 'km',
  kilometer: 'km',
  kilometres: 'km',
  kilometers: 'km',
  mi: 'mi',
  mile: 'mi',
  miles: 'mi',
  m: 'm',
  metre: 'm',
  meter: 'm',
  metres: 'm',
  meters: 'm',
};
const timeUnits: Record<string, TimeUnit> = {
  s: 's',
  sec: 's',
  secs: 's',
  seconds: 's',
  min: 'min',
  mins: 'min',
  minutes: 'min',
  h: 'h',
  hr: 'h',
  hrs: 'h',
  hours: 'h',
};

const tidy = (header: string) =>
  header
    .toLowerCase()
    .replace(/[_\-.()[\]/]+/g, ' ')
    .replace(/\s+/g, ' ')
    .trim();

/** 'Distance (km)' gives ['distance', 'km']; a header without a unit has an empty second part. */
function split(header: string): [string, string] {
  const text = tidy(header);
  const last = text.slice(text.lastIndexOf(' ') + 1);
  if (last !== text && (last in distanceUnits || last in timeUnits))
    return [text.slice(0, -last.length - 1).replace(/ in$/, ''), last];
  return [text, ''];
}

/** Column of each field by its header; the first fitting header word in the list wins. */
export function matchHeaders(headers: string[]): Partial<Record<CsvField, number>> {
  const names = headers.map((header) => split(header)[0]);
  const found: Partial<Record<CsvField, number>> = {};
  for (const field of Object.keys(words) as CsvField[]) {
    const word = words[field].find((candidate) => names.includes(candidate));
    if (word !== undefined) found[field] = names.indexOf(word);
  }
  return found;
}

/** Distance unit that the header names, or null. */
export function headerDistanceUnit(header: string): DistanceUnit | null {
  const [name, unit] = split(header);
  return distanceUnits[unit] ?? distanceUnits[name] ?? null;
}

/** Time unit that the header names, or null. */
export function headerTimeUnit(header: string): TimeUnit | null {
  return timeUnits[split(header)[1]] ?? null;
}
