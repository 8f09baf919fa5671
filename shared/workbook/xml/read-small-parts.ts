import { READER_LIMITS } from '#shared/workbook/limits.ts';
import type { SheetInfo } from '#shared/workbook/types.ts';
import { WorkbookRefused } from '#shared/workbook/workbook-refused.ts';
import { type DateFormat, dateFormatOf } from './date-format.ts';
import { attribute, parseXmlPart } from './parse-xml.ts';

type Chunks = AsyncIterable<Uint8Array>;

/** Counts what a small part lists: without an end to it, a list would fill the memory long before the part is too large. */
function counted(part: string, limit: number): () => void {
  let count = 0;
  return () => {
    if (++count > limit) throw new WorkbookRefused('too-many-parts', { part });
  };
}

export type Relationship = { readonly type: string; readonly target: string };

/** Relationships by id; external ones lead nowhere in the file and are left out. */
export async function readRelationships(part: string, chunks: Chunks): Promise<Map<string, Relationship>> {
  const found = new Map<string, Relationship>();
  const count = counted(part, READER_LIMITS.partNames);
  await parseXmlPart(part, chunks, {
    root: 'Relationships',
    open: (name, tag) => {
      count();
      const id = attribute(tag, 'Id');
      if (name !== 'Relationship' || id === undefined) return;
      if (attribute(tag, 'TargetMode')?.toLowerCase() === 'external') return;
      // Transitional and strict types differ in all but their last word.
      const type = (attribute(tag, 'Type') ?? '').split('/').pop() ?? '';
      found.set(id, { type, target: attribute(tag, 'Target') ?? '' });
    },
  });
  return found;
}

/** Content type of a part: by its own name, else by its extension. Names in lower case. */
export async function readContentTypes(
  part: string,
  chunks: Chunks,
): Promise<(name: string) => string | undefined> {
  const byName = new Map<string, string>();
  const byExtension = new Map<string, string>();
  const count = counted(part, READER_LIMITS.partNames);
  await parseXmlPart(part, chunks, {
    root: 'Types',
    open: (name, tag) => {
      count();
      const type = attribute(tag, 'ContentType') ?? '';
      if (name === 'Override') {
        byName.set((attribute(tag, 'PartName') ?? '').replace(/^\//, '').toLowerCase(), type);
      } else if (name === 'Default') {
        byExtension.set((attribute(tag, 'Extension') ?? '').toLowerCase(), type);
      }
    },
  });
  return (name) => byName.get(name) ?? byExtension.get(name.slice(name.lastIndexOf('.') + 1));
}

export type SheetEntry = Pick<SheetInfo, 'name' | 'hidden'> & { readonly relationship: string };

/** An XML boolean; a word that is none would decide in silence between two dates four years apart. */
function readDate1904(text: string | undefined, part: string): boolean {
  const word = (text ?? '0').trim().toLowerCase();
  if (/^(1|true|on)$/.test(word)) return true;
  if (/^(0|false|off|)$/.test(word)) return false;
  throw new WorkbookRefused('xml-damaged', { part });
}

export async function readWorkbookPart(
  part: string,
  chunks: Chunks,
): Promise<{ date1904: boolean; sheets: SheetEntry[] }> {
  let date1904 = false;
  const sheets: SheetEntry[] = [];
  await parseXmlPart(part, chunks, {
    root: 'workbook',
    otherwise: 'not-a-workbook',
    open: (name, tag, parents) => {
      if (name === 'workbookPr' && parents.length === 1) {
        date1904 = readDate1904(attribute(tag, 'date1904'), part);
      }
      if (name !== 'sheet' || parents.at(-1) !== 'sheets') return;
      if (sheets.length >= READER_LIMITS.sheets) {
        throw new WorkbookRefused('too-many-sheets', { limit: READER_LIMITS.sheets });
      }
      if ((attribute(tag, 'name') ?? '').length > READER_LIMITS.sheetName) {
        throw new WorkbookRefused('xml-damaged', { part, sheet: attribute(tag, 'name') ?? '' });
      }
      sheets.push({
        name: attribute(tag, 'name') ?? '',
        hidden: (attribute(tag, 'state') ?? 'visible') !== 'visible',
        relationship: attribute(tag, 'id') ?? '',
      });
    },
  });
  return { date1904, sheets };
}

/** For each cell style, what its number format shows of a date. */
export async function readDateStyles(part: string, chunks: Chunks): Promise<DateFormat[]> {
  const codes = new Map<number, string>();
  const formats: number[] = [];
  const count = counted(part, READER_LIMITS.styles);
  await parseXmlPart(part, chunks, {
    root: 'styleSheet',
    open: (name, tag, parents) => {
      const parent = parents.at(-1);
      const id = Number(attribute(tag, 'numFmtId') ?? '0');
      if (name === 'numFmt' && parent === 'numFmts') {
        count();
        codes.set(id, attribute(tag, 'formatCode') ?? '');
      }
      if (name === 'xf' && parent === 'cellXfs') {
        count();
        formats.push(id);
      }
    },
  });
  return formats.map((id) => dateFormatOf(id, codes.get(id)));
}

/** `keywords` of the core properties; null without any. */
export async function readKeywords(part: string, chunks: Chunks): Promise<string | null> {
  let keywords = '';
  await parseXmlPart(part, chunks, {
    root: 'coreProperties',
    text: (text, path) => {
      // Longer ones are none of the template's.
      if (path.at(-1) === 'keywords' && keywords.length <= READER_LIMITS.keywords) keywords += text;
    },
  });
  return keywords.length > READER_LIMITS.keywords ? null : keywords.trim() || null;
}
