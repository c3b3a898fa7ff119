/** ISO instant of a cell that carries a date, a time and a zone ('2025-05-03T08:10:00+02:00'), or null. */
export function startInstant(text: string): string | null {
  const iso = /^\d{4}-\d{2}-\d{2}[T ]\d{2}:\d{2}(:\d{2}(\.\d+)?)?\s*(Z|[+-]\d{2}:?\d{2})$/.exec(text);
  if (!iso) return null;
  const time = Date.parse(text.replace(' ', 'T').replace(/\s/g, ''));
  return Number.isNaN(time) ? null : new Date(time).toISOString();
}
