import { once } from 'node:events';
import { finished } from 'node:stream/promises';
import type { Client } from 'pg';
import { from as copyFrom } from 'pg-copy-streams';
import { SnakeNames } from '../database/snake-names';

const names = new SnakeNames();
const ESCAPES: Record<string, string> = { '\\': '\\\\', '\t': '\\t', '\n': '\\n', '\r': '\\r' };

const escaped = (text: string) => text.replace(/[\\\t\n\r]/g, (c) => ESCAPES[c] ?? c);

/** A value as COPY's text format writes it. */
function field(value: unknown): string {
  if (value === null || value === undefined) return '\\N';
  if (typeof value === 'string') return escaped(value);
  if (value instanceof Date) return value.toISOString();
  if (Array.isArray(value) && value.every((item) => typeof item === 'number')) return `{${value.join(',')}}`;
  if (typeof value === 'object') return escaped(JSON.stringify(value));
  return String(value);
}

/** Writes rows whose properties are the table's columns, all of them alike, as fast as PostgreSQL takes them. */
export async function copyRows(client: Client, table: string, rows: readonly object[]): Promise<void> {
  const [first] = rows;
  if (!first) return;
  const keys = Object.keys(first);
  const columns = keys.map((key) => names.columnName(key, undefined));
  const stream = client.query(copyFrom(`copy ${table} (${columns.join(', ')}) from stdin`));
  const done = finished(stream);
  for (let i = 0; i < rows.length; i += 1000) {
    const lines = rows
      .slice(i, i + 1000)
      .map((row) => keys.map((key) => field((row as Record<string, unknown>)[key])).join('\t'));
    if (!stream.write(`${lines.join('\n')}\n`)) await Promise.race([once(stream, 'drain'), done]);
  }
  stream.end();
  await done;
}
