import { SaxesParser, type SaxesTagPlain } from 'saxes';
import { READER_LIMITS } from '#shared/workbook/limits.ts';
import { type RefusalCode, WorkbookRefused } from '#shared/workbook/workbook-refused.ts';
import { isKnownChild } from './known-children.ts';
import { createXmlDecoder } from './xml-decoder.ts';

export type XmlTag = Pick<SaxesTagPlain, 'attributes'>;

export type XmlHandlers = {
  /** Local name of the outermost element: a part that holds something else is not what its name says. */
  readonly root: string;
  /** What a part with another outermost element is refused as; damaged unless said. */
  readonly otherwise?: RefusalCode;
  /** `parents` are the local names of the open elements around this one, outermost first. */
  readonly open?: (name: string, tag: XmlTag, parents: readonly string[]) => void;
  readonly close?: (name: string, parents: readonly string[]) => void;
  readonly text?: (text: string, path: readonly string[]) => void;
};

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

const ALTERNATIVES = 'AlternateContent';

/**
 * Elements that add other vocabularies to a part (ECMA-376 Part 3): extensions and choices that need more than we know are
 * left out, the fallback stands in the place of the whole.
 */
function standsFor(name: string, within: string | undefined): 'nothing' | 'its content' | 'itself' {
  if (name === 'extLst') return 'nothing';
  if (name === ALTERNATIVES) return 'its content';
  if (within !== ALTERNATIVES) return 'itself';
  return name === 'Fallback' ? 'its content' : 'nothing';
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
  /** Every open element outside of what is left out: its name, and whether it stands on the path. */
  const open: { name: string; shown: boolean }[] = [];
  let skipping = 0;
  let events = 0;
  let textLength = 0;

  parser.on('error', () => {
    throw new WorkbookRefused('xml-damaged', { part });
  });
  parser.on('doctype', () => {
    throw new WorkbookRefused('xml-doctype', { part });
  });
  parser.on('opentag', (tag) => {
    events++;
    textLength = 0;
    const name = localName(tag.name);
    if (open.length + skipping >= READER_LIMITS.xmlDepth) throw new WorkbookRefused('xml-too-deep', { part });
    if (open.length === 0 && skipping === 0 && name !== handlers.root) {
      throw new WorkbookRefused(handlers.otherwise ?? 'xml-damaged', { part });
    }
    const stands = standsFor(name, open.at(-1)?.name);
    if (skipping > 0 || stands === 'nothing') {
      skipping++;
      return;
    }
    const shown = stands === 'itself';
    open.push({ name, shown });
    if (!shown) return;
    if (!isKnownChild(path.at(-1), name)) throw new WorkbookRefused('xml-damaged', { part });
    handlers.open?.(name, tag, path);
    path.push(name);
  });
  parser.on('closetag', () => {
    events++;
    textLength = 0;
    if (skipping > 0) {
      skipping--;
      return;
    }
    if (open.pop()?.shown !== true) return;
    const name = path.pop();
    if (name !== undefined) handlers.close?.(name, path);
  });
  const text = (value: string): void => {
    events++;
    // One text may come in many pieces, which together are one text still.
    textLength += value.length;
    if (textLength > READER_LIMITS.xmlSilence) throw new WorkbookRefused('xml-too-long', { part });
    if (skipping === 0) handlers.text?.(value, path);
  };
  const passed = (): void => {
    events++;
  };
  parser.on('comment', passed);
  parser.on('processinginstruction', passed);
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
