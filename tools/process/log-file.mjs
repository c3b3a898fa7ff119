import { existsSync, mkdirSync, openSync, readFileSync, renameSync } from 'node:fs';
import { dirname } from 'node:path';

/** Opens a log anew for its owner's eyes; the one of the run before stays beside it as `.before`. */
export function openLog(file) {
  mkdirSync(dirname(file), { recursive: true });
  if (existsSync(file)) renameSync(file, `${file}.before`);
  return openSync(file, 'w', 0o600);
}

/** The last line of a log that speaks of an error, without the dressing of a JSON log line. */
function lastComplaint(file) {
  const lines = existsSync(file) ? readFileSync(file, 'utf8').trim().split('\n') : [];
  const line = lines.findLast((text) => /error|fatal|panic|^postgres:/i.test(text));
  if (!line) return undefined;
  try {
    const { err, msg } = JSON.parse(line);
    return err?.message ?? msg ?? line;
  } catch {
    return line.trim();
  }
}

/** One sentence on a program that ended by itself, with what it said last in its log. */
export function stoppedSentence(name, { code, signal }, log) {
  const complaint = lastComplaint(log);
  const how = signal ? `was ended by ${signal}` : `stopped with exit code ${code}`;
  return `${name} ${how}${complaint ? `: ${complaint}` : ''} (log: ${log}).`;
}
