import { SaxesParser, type SaxesTagPlain } from 'saxes';
import { READER_LIMITS } from '#shared/workbook/limits.ts';
import { WorkbookRefused } from '#shared/workbook/workbook-refused.ts';
import { createXmlDecoder } from './xml-decoder.ts';

export type XmlTag = Pick<SaxesTagPlain, 'attributes'>;

export type XmlHandlers = {
  /** `parents` are the local names of the open elements around this one, outermost first. */
  readonly open?: (name: string, tag: XmlTag, parents: readonly string[]) => void;
  readonly close?: (name: string, parents: readonly string[]) => void;
  readonly text?: (text: string, path: readonly string[]) => void;
};

/** Content that repeats or extends the sheet in other vocabularies: its local names could be mistaken for cells. */
const SKIPPED = new Set(['extLst', 'AlternateContent']);

function localName(name: string): string {
  const colon = name.indexOf(':');
  return colon < 0 ? name : name.slice(colon + 1);
}

/** An attribute by its local name; one without prefix wins over one with. */
export function attribute(tag: XmlTag, name: string): string | undefined {
  const plain = tag.attributes[name];
  if (plain !== undefined) return plain;
  const suffix = `:${name}`;
  for (const key in tag.attributes) {
    if (key.endsWith(suffix) && !key.startsWith('xmlns:')) return tag.attributes[key];
  }
  return undefined;
}

/**
 * Parses one part. Yields after every chunk, so that the caller can hand on what was read and stop early.
 * Namespaces are not resolved: local names are enough for workbooks and hold for transitional and strict files alike.
 */
export async function* parseXml(
  part: string,
  chunks: AsyncIterable<Uint8Array>,
  handlers: XmlHandlers,
): AsyncGenerator<void> {
  const parser = new SaxesParser({ xmlns: false, position: false });
  const path: string[] = [];
  let skipping = 0;
  let events = 0;

  parser.on('error', () => {
    throw new WorkbookRefused('xml-damaged', { part });
  });
  parser.on('doctype', () => {
    throw new WorkbookRefused('xml-doctype', { part });
  });
  parser.on('opentag', (tag) => {
    events++;
    const name = localName(tag.name);
    if (path.length + skipping >= READER_LIMITS.xmlDepth) throw new WorkbookRefused('xml-too-deep', { part });
    if (skipping > 0 || SKIPPED.has(name)) {
      skipping++;
      return;
    }
    handlers.open?.(name, tag, path);
    path.push(name);
  });
  parser.on('closetag', () => {
    events++;
    if (skipping > 0) {
      skipping--;
      return;
    }
    const name = path.pop();
    if (name !== undefined) handlers.close?.(name, path);
  });
  const text = (value: string): void => {
    events++;
    if (skipping === 0) handlers.text?.(value, path);
  };
  parser.on('text', text);
  parser.on('cdata', text);

  const decode = createXmlDecoder(part);
  let silence = 0;
  for await (const chunk of chunks) {
    const before = events;
    const xml = decode(chunk);
    parser.write(xml);
    silence = events === before ? silence + xml.length : 0;
    if (silence > READER_LIMITS.xmlSilence) throw new WorkbookRefused('xml-too-long', { part });
    yield;
  }
  parser.write(decode(null));
  parser.close();
  yield;
}

/** Parses a whole (small) part. */
export async function parseXmlPart(
  part: string,
  chunks: AsyncIterable<Uint8Array>,
  handlers: XmlHandlers,
): Promise<void> {
  const steps = parseXml(part, chunks, handlers);
  while (!(await steps.next()).done);
}
