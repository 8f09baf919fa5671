import type { SheetInfo } from '#shared/workbook/types.ts';
import { type DateFormat, dateFormatOf } from './date-format.ts';
import { attribute, parseXmlPart } from './parse-xml.ts';

type Chunks = AsyncIterable<Uint8Array>;

export type Relationship = { readonly type: string; readonly target: string };

/** Relationships by id; external ones lead nowhere in the file and are left out. */
export async function readRelationships(part: string, chunks: Chunks): Promise<Map<string, Relationship>> {
  const found = new Map<string, Relationship>();
  await parseXmlPart(part, chunks, {
    open: (name, tag) => {
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
  await parseXmlPart(part, chunks, {
    open: (name, tag) => {
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

export async function readWorkbookPart(
  part: string,
  chunks: Chunks,
): Promise<{ date1904: boolean; sheets: SheetEntry[] }> {
  let date1904 = false;
  const sheets: SheetEntry[] = [];
  await parseXmlPart(part, chunks, {
    open: (name, tag, parents) => {
      if (name === 'workbookPr') date1904 = /^(1|true|on)$/.test(attribute(tag, 'date1904') ?? '');
      if (name !== 'sheet' || parents.at(-1) !== 'sheets') return;
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
  await parseXmlPart(part, chunks, {
    open: (name, tag, parents) => {
      const parent = parents.at(-1);
      const id = Number(attribute(tag, 'numFmtId') ?? '0');
      if (name === 'numFmt' && parent === 'numFmts') codes.set(id, attribute(tag, 'formatCode') ?? '');
      if (name === 'xf' && parent === 'cellXfs') formats.push(id);
    },
  });
  return formats.map((id) => dateFormatOf(id, codes.get(id)));
}

/** `keywords` of the core properties; null without any. */
export async function readKeywords(part: string, chunks: Chunks): Promise<string | null> {
  let keywords = '';
  await parseXmlPart(part, chunks, {
    text: (text, path) => {
      if (path.at(-1) === 'keywords') keywords += text;
    },
  });
  return keywords.trim() || null;
}
