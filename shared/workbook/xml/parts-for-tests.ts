import type { Workbook } from '#shared/workbook/types.ts';
import { createCollector } from './collect-workbook.ts';
import type { PartSource } from './part-source.ts';
import { readPackage } from './read-package.ts';

const MAIN = 'http://schemas.openxmlformats.org/spreadsheetml/2006/main';
const OFFICE = 'http://schemas.openxmlformats.org/officeDocument/2006/relationships';
const PACKAGE = 'http://schemas.openxmlformats.org/package/2006';
const SHEET_TYPE = 'application/vnd.openxmlformats-officedocument.spreadsheetml.sheet.main+xml';

export type Parts = Record<string, string | Uint8Array>;

const relationship = (id: string, type: string, target: string): string =>
  `<Relationship Id="${id}" Type="${OFFICE}/${type}" Target="${target}"/>`;

/** Parts of a workbook with one sheet; `sheetData` is the inside of that element, `more` replaces or adds parts. */
export function workbookParts(sheetData: string, more: Parts = {}): Parts {
  const related = [
    relationship('rId1', 'worksheet', 'worksheets/sheet1.xml'),
    'xl/sharedStrings.xml' in more ? relationship('rId2', 'sharedStrings', 'sharedStrings.xml') : '',
    'xl/styles.xml' in more ? relationship('rId3', 'styles', 'styles.xml') : '',
  ];
  return {
    '[Content_Types].xml': `<Types xmlns="${PACKAGE}/content-types"><Default Extension="xml" ContentType="application/xml"/><Override PartName="/xl/workbook.xml" ContentType="${SHEET_TYPE}"/></Types>`,
    '_rels/.rels': `<Relationships xmlns="${PACKAGE}/relationships"><Relationship Id="r1" Type="${OFFICE}/officeDocument" Target="xl/workbook.xml"/></Relationships>`,
    'xl/workbook.xml': `<workbook xmlns="${MAIN}" xmlns:r="${OFFICE}"><sheets><sheet name="Set" sheetId="1" r:id="rId1"/></sheets></workbook>`,
    'xl/_rels/workbook.xml.rels': `<Relationships xmlns="${PACKAGE}/relationships">${related.join('')}</Relationships>`,
    'xl/worksheets/sheet1.xml': `<worksheet xmlns="${MAIN}"><sheetData>${sheetData}</sheetData></worksheet>`,
    ...more,
  };
}

/** Parts in memory, handed out in small chunks so that borders fall inside tags, texts and characters. */
export function partsSource(parts: Parts, chunkBytes = 7): PartSource {
  const byName = new Map(Object.entries(parts).map(([name, content]) => [name.toLowerCase(), content]));
  async function* open(name: string): AsyncGenerator<Uint8Array> {
    const content = byName.get(name) ?? '';
    const bytes = typeof content === 'string' ? new TextEncoder().encode(content) : content;
    for (let at = 0; at < bytes.length; at += chunkBytes) yield bytes.subarray(at, at + chunkBytes);
  }
  return { names: [...byName.keys()], has: (name) => byName.has(name), open };
}

export async function readParts(parts: Parts, chunkBytes?: number): Promise<Workbook> {
  const collector = createCollector();
  for await (const event of readPackage(partsSource(parts, chunkBytes))) collector.add(event);
  return collector.finish();
}

/** Cells of the first sheet as `[address, kind, text]`. */
export async function readCells(sheetData: string, more: Parts = {}): Promise<[string, string, string][]> {
  const { sheets } = await readParts(workbookParts(sheetData, more));
  return (sheets[0]?.rows ?? []).flatMap(({ cells }) =>
    cells.map(({ address, kind, raw }): [string, string, string] => [address, kind, raw]),
  );
}
