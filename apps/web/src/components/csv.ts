export type CsvValue = string | number | null;

const quoted = (value: CsvValue) => {
  const text = value === null ? '' : String(value);
  const plain = typeof value === 'string' && /^[=+\-@\t\r]/.test(text) ? `'${text}` : text;
  return /[",\r\n]/.test(plain) ? `"${plain.replaceAll('"', '""')}"` : plain;
};

/** Rows as comma-separated values (RFC 4180); text that a spreadsheet would run as a formula is disarmed. */
export const toCsv = (rows: readonly (readonly CsvValue[])[]): string =>
  rows.map((row) => row.map(quoted).join(',') + '\r\n').join('');

/** Hands the text to the browser as a file. */
export function downloadCsv(fileName: string, rows: readonly (readonly CsvValue[])[]): void {
  const url = URL.createObjectURL(new Blob(['\uFEFF', toCsv(rows)], { type: 'text/csv;charset=utf-8' }));
  const link = Object.assign(document.createElement('a'), { href: url, download: fileName });
  link.click();
  URL.revokeObjectURL(url);
}
