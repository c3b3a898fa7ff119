export type Content = 'empty' | 'zip' | 'gzip' | 'fit' | 'xml' | 'text' | 'binary';

/** What a file is by its first bytes; its name is not trusted. */
export function contentOf(bytes: Uint8Array): Content {
  if (bytes.length === 0) return 'empty';
  if (starts(bytes, 0x50, 0x4b) && (bytes[2] ?? 0) < 9) return 'zip';
  if (starts(bytes, 0x1f, 0x8b)) return 'gzip';
  const head = String.fromCharCode(...bytes.subarray(0, 512));
  if (head.slice(8, 12) === '.FIT') return 'fit';
  const text = head.replaceAll('\0', '').replace(/^(\u00ef\u00bb\u00bf|\u00ff\u00fe|\u00fe\u00ff)?\s*/, '');
  if (text.startsWith('<')) return 'xml';
  if (text === '') return 'empty';
  const wide = starts(bytes, 0xff, 0xfe) || starts(bytes, 0xfe, 0xff);
  return head.includes('\0') && !wide ? 'binary' : 'text';
}

const starts = (bytes: Uint8Array, first: number, second: number) =>
  bytes[0] === first && bytes[1] === second;
