/** A number as written by hand, with a decimal point or comma; undefined when it is none. */
export function readNumber(text: string): number | undefined {
  const plain = text.trim().replace(/[\s']/g, '').replace(',', '.');
  if (!/^[+-]?(\d+\.?\d*|\.\d+)$/.test(plain)) return undefined;
  return Number(plain);
}

/** A number for a field: at most `decimals` places and no idle zeros. */
export const writeNumber = (value: number, decimals: number): string =>
  String(Number(value.toFixed(decimals)));

/** What a field keeps of what is typed: null when empty, NaN when it is no number, else scaled. */
export function keepNumber(text: string, scale: number, whole: boolean): number | null {
  if (text.trim() === '') return null;
  const scaled = (readNumber(text) ?? NaN) * scale;
  return whole ? Math.round(scaled) : scaled;
}
