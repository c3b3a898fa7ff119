export type CsvValue = string | number | null;

const quoted = (value: CsvValue) => {
  const text = value === null ? '' : String(value);
  const plain = typeof value === 'string' && /^[=+\-@\t\r]/.test(text) ? `'${text}` : text;
  return /[",\r\n]/.test(plain) ? `"${plain.replaceAll('"', '""')}"` : plain;
};

/** Rows as comma-separated values (RFC 4180); text that a spreadsheet would run as a formula is disarmed. */
export const toCsv = (rows: readonly (readonly CsvValue[])[]): string =>
  rows.map((row) => row.map(quoted).join(',') + '\r\n').join('');
