import { READER_LIMITS } from '#shared/workbook/limits.ts';
import { WorkbookRefused } from '#shared/workbook/workbook-refused.ts';
import { decodeEscapes } from './decode-escapes.ts';
import { parseXmlPart } from './parse-xml.ts';

/** Texts by index: the runs of rich text joined, phonetic runs left out. */
export async function readSharedStrings(part: string, chunks: AsyncIterable<Uint8Array>): Promise<string[]> {
  const strings: string[] = [];
  let item = '';
  let run = '';
  let characters = 0;
  const add = (): void => {
    item += decodeEscapes(run);
    if (characters + item.length > READER_LIMITS.characters)
      throw new WorkbookRefused('too-much-text', { part });
  };
  await parseXmlPart(part, chunks, {
    root: 'sst',
    open: (name) => {
      if (name === 'si') item = '';
      if (name === 't') run = '';
    },
    text: (text, path) => {
      if (path.at(-1) === 't' && !path.includes('rPh')) run += text;
    },
    close: (name, parents) => {
      if (name === 't' && !parents.includes('rPh')) add();
      if (name !== 'si') return;
      characters += item.length;
      if (strings.length >= READER_LIMITS.sharedStrings) {
        throw new WorkbookRefused('too-much-text', { part });
      }
      strings.push(item);
    },
  });
  return strings;
}
