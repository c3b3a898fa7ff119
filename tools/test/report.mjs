import { existsSync, readFileSync } from 'node:fs';

const heads = ['stage', 'passed', 'failed', 'skipped', 'seconds', ''];

/** One line per stage with its counts and seconds. */
export function table(results) {
  const rows = results.map(({ name, passed, failed, skipped, seconds, note = '' }) => [
    name,
    ...[passed, failed, skipped].map(String),
    seconds.toFixed(1),
    note,
  ]);
  const widths = heads.map((head, i) => Math.max(head.length, ...rows.map((row) => row[i].length)));
  const cell = (text, i) => (i === 0 || i === 5 ? text.padEnd(widths[i]) : text.padStart(widths[i]));
  return [heads, ...rows].map((row) => row.map(cell).join('  ').trimEnd()).join('\n');
}

/** The end of a failed stage's log: what went wrong is usually there. */
export function endOf(log, lines = 120) {
  return existsSync(log) ? readFileSync(log, 'utf8').trimEnd().split('\n').slice(-lines).join('\n') : '';
}

/** All counts added up. */
export function totals(results) {
  const sum = (key) => results.reduce((total, result) => total + result[key], 0);
  return { passed: sum('passed'), failed: sum('failed') };
}
