import { SaxesParser } from 'saxes';
import { letOthersRun } from '../pause';
import { UnreadableFile } from '../unreadable';

const CHUNK_BYTES = 256 * 1024;
const MAX_DEPTH = 64;
const MAX_ATTRIBUTES = 200;

/** What a reader of one XML format does with the stream; names come without their prefix. */
export interface XmlReader {
  open(name: string, attributes: Record<string, string>, parent: string): void;
  close(name: string, text: string, parent: string): void;
}

const local = (name: string) => name.slice(name.indexOf(':') + 1);

/**
 * Streams XML through a reader in small pieces, letting other work run in between. No document type,
 * so no entities beyond XML's own five; depth and attributes are bounded.
 * @param choose gives the reader for the root element, or throws UnreadableFile
 * @throws UnreadableFile with a plain sentence
 */
export async function streamXml(bytes: Uint8Array, choose: (root: string) => XmlReader): Promise<void> {
  const parser = new SaxesParser({ xmlns: false, position: true });
  const path: string[] = [];
  let reader: XmlReader | null = null;
  let text = '';
  let attributes = 0;
  parser.on('doctype', () => {
    throw new UnreadableFile(
      'The file declares a document type, which ride files have no need of: it was not read.',
    );
  });
  parser.on('error', (error) => {
    throw new UnreadableFile(brokenAt(error.message, path.length > 0));
  });
  parser.on('attribute', () => {
    if (++attributes > MAX_ATTRIBUTES)
      throw new UnreadableFile('The file is not a ride: one tag has too many attributes.');
  });
  parser.on('opentag', (tag) => {
    const name = local(tag.name);
    reader ??= choose(name);
    if (path.length >= MAX_DEPTH) throw new UnreadableFile('The file is nested too deeply to be a ride.');
    reader.open(name, tag.attributes, path.at(-1) ?? '');
    path.push(name);
    text = '';
    attributes = 0;
  });
  const addText = (piece: string) => {
    if (text.length < 200) text += piece;
  };
  parser.on('text', addText);
  parser.on('cdata', addText);
  parser.on('closetag', () => {
    const name = path.pop() ?? '';
    reader?.close(name, text.trim(), path.at(-1) ?? '');
    text = '';
  });
  const decoder = new TextDecoder(encodingOf(bytes));
  for (let at = 0; at < bytes.length; at += CHUNK_BYTES) {
    parser.write(decoder.decode(bytes.subarray(at, at + CHUNK_BYTES), { stream: true }));
    await letOthersRun();
  }
  parser.write(decoder.decode()).close();
}

function brokenAt(error: string, inside: boolean): string {
  const [line] = error.split(':');
  if (/unclosed|unexpected end|must contain a root/i.test(error) && inside) {
    return 'The file breaks off before its end: copy it from the device again.';
  }
  return `The file is damaged near line ${line}: copy it from the device again.`;
}

/** Encoding by byte order mark or XML declaration; UTF-8 otherwise. */
function encodingOf(bytes: Uint8Array): string {
  if (bytes[0] === 0xff && bytes[1] === 0xfe) return 'utf-16le';
  if (bytes[0] === 0xfe && bytes[1] === 0xff) return 'utf-16be';
  const head = String.fromCharCode(...bytes.subarray(0, 200));
  const label = /^[^<]*<\?xml[^>]*\bencoding=["']([\w.-]+)["']/.exec(head)?.[1] ?? 'utf-8';
  try {
    return /^utf-?16/i.test(label) ? 'utf-8' : new TextDecoder(label).encoding;
  } catch {
    throw new UnreadableFile(
      `The file says it is written in “${label}”, which is not known: save it as UTF-8.`,
    );
  }
}
