import { WorkbookRefused } from '#shared/workbook/workbook-refused.ts';

/** Bytes within which an XML declaration names its encoding. */
const HEAD_BYTES = 120;

/** Encoding by byte order mark, by the shape of `<` in UTF-16, else as the XML declaration says; UTF-8 otherwise. */
function encodingOf(start: Uint8Array): string {
  const [a, b] = start;
  if (a === 0xff && b === 0xfe) return 'utf-16le';
  if (a === 0xfe && b === 0xff) return 'utf-16be';
  if (a === 0x3c && b === 0) return 'utf-16le';
  if (a === 0 && b === 0x3c) return 'utf-16be';
  const head = String.fromCharCode(...start.subarray(0, HEAD_BYTES));
  const named = /^(?:\xef\xbb\xbf)?<\?xml[^>]*?encoding\s*=\s*["']([\w.-]+)["']/.exec(head)?.[1] ?? 'utf-8';
  // A declaration that could be read byte by byte is not in UTF-16, whatever it says.
  return /^utf-?16/i.test(named) ? 'utf-8' : named;
}

function joined(parts: readonly Uint8Array[]): Uint8Array {
  const whole = new Uint8Array(parts.reduce((length, part) => length + part.length, 0));
  let at = 0;
  for (const part of parts) {
    whole.set(part, at);
    at += part.length;
  }
  return whole;
}

/** Bytes to text across chunk borders; `null` ends the text. Bytes that the encoding does not know refuse the part: a replacement character would be a silent change. */
export function createXmlDecoder(part: string): (chunk: Uint8Array | null) => string {
  let decoder: TextDecoder | null = null;
  const head: Uint8Array[] = [];
  let length = 0;
  const begin = (): Uint8Array => {
    const start = joined(head);
    decoder = new TextDecoder(encodingOf(start), { fatal: true });
    return start;
  };
  return (chunk) => {
    try {
      if (decoder !== null)
        return chunk === null ? decoder.decode() : decoder.decode(chunk, { stream: true });
      if (chunk !== null) {
        head.push(chunk);
        length += chunk.length;
        if (length < HEAD_BYTES) return '';
      }
      const start = begin();
      return decoder!.decode(start, { stream: chunk !== null });
    } catch {
      throw new WorkbookRefused('xml-damaged', { part });
    }
  };
}
