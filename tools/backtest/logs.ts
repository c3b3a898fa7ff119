import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { dayOf, RiderLog } from '@halfpitch/estimation';

/** Rider logs of a folder: NAME.csv with the columns date, distance_km. */
export function readLogs(folder: string): RiderLog[] {
  const files = readdirSync(folder)
    .filter((name) => name.endsWith('.csv'))
    .sort();
  return files.map((file) => {
    const [head = '', ...lines] = readFileSync(join(folder, file), 'utf8').trim().split('\n');
    const columns = head.trim().split(',');
    const date = columns.indexOf('date');
    const distance = columns.indexOf('distance_km');
    if (date < 0 || distance < 0) throw new Error(`${file} lacks the column date or distance_km.`);
    const rides = lines
      .map((line) => line.trim().split(','))
      .map((cells) => ({ day: dayOf(cells[date]!), km: Number(cells[distance]) }))
      .filter(({ km }) => km > 0);
    return { rider: file.replace(/\.csv$/, ''), rides };
  });
}
