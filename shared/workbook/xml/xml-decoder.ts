import { WorkbookRefused } from '#shared/workbook/workbook-refused.ts';

/** Encoding by byte order mark, by the shape of `<` in UTF-16, else as the XML declaration says; UTF-8 otherwise. */
function encodingOf(start: Uint8Array): string {
  const [a, b] = start;
  if (a === 0xff && b === 0xfe) return 'utf-16le';
  if (a === 0xfe && b === 0xff) return 'utf-16be';
  if (a === 0x3c && b === 0) return 'utf-16le';
  if (a === 0 && b === 0x3c) return 'utf-16be';
  const head = String.fromCharCode(...start.subarray(0, 120));
  return /^(?:\xef\xbb\xbf)?<\?xml[^>]*?encoding\s*=\s*["']([\w.-]+)["']/.exec(head)?.[1] ?? 'utf-8';
}

/** Bytes to text across chunk borders; `null` ends the text. Bytes that the encoding does not know refuse the part: a replacement character would be a silent change. */
export function createXmlDecoder(part: string): (chunk: Uint8Array | null) => string {
  let decoder: TextDecoder | null = null;
  return (chunk) => {
    try {
      if (chunk === null) return decoder?.decode() ?? '';
      decoder ??= new TextDecoder(encodingOf(chunk), { fatal: true });
      return decoder.decode(chunk, { stream: true });
    } catch {
      throw new WorkbookRefused('xml-damaged', { part });
    }
  };
}
