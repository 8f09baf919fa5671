import { WorkbookRefused } from '#shared/workbook/workbook-refused.ts';
import type { PartSource } from './part-source.ts';
import { readContentTypes, readRelationships } from './read-small-parts.ts';
import { partName, resolveTarget } from './resolve-target.ts';

const OTHERS: readonly (readonly [RegExp, string])[] = [
  [/wordprocessingml|ms-word/, 'word'],
  [/presentationml|ms-powerpoint/, 'slides'],
  [/visio/, 'drawing'],
];

/** Name of the workbook part and of the core properties; refuses what is packed the same way but is no plain workbook. */
export async function findMainPart(parts: PartSource): Promise<{ main: string; core: string | null }> {
  const types = '[content_types].xml';
  if (!parts.has(types)) {
    throw new WorkbookRefused(parts.has('mimetype') ? 'other-document' : 'not-a-workbook', { what: 'other' });
  }
  const typeOf = await readContentTypes(types, parts.open(types));
  const rootRels = '_rels/.rels';
  const root = parts.has(rootRels)
    ? [...(await readRelationships(rootRels, parts.open(rootRels))).values()]
    : [];
  const target = root.find((one) => one.type === 'officeDocument')?.target;
  const main = target === undefined ? 'xl/workbook.xml' : resolveTarget('', target);
  const type = typeOf(main)?.toLowerCase() ?? '';

  const other = OTHERS.find(([pattern]) => pattern.test(type));
  if (other) throw new WorkbookRefused('other-document', { what: other[1] });
  if (type.includes('sheet.binary') || main.endsWith('.bin')) throw new WorkbookRefused('binary-workbook');
  // Macros are never run here, but a record must not travel on as a file that can act.
  if (type.includes('macroenabled') || parts.names.some((name) => name.endsWith('/vbaproject.bin'))) {
    throw new WorkbookRefused('macro-enabled');
  }
  if (!parts.has(main)) throw new WorkbookRefused('not-a-workbook');
  // Anything else (types that differ in case, generic xml) is judged by what the part holds.
  if (type !== '' && !type.includes('spreadsheetml') && !type.endsWith('xml')) {
    throw new WorkbookRefused('other-document', { what: 'other' });
  }
  const coreTarget = root.find((one) => one.type === 'core-properties')?.target;
  return { main, core: coreTarget === undefined ? null : partName(resolveTarget('', coreTarget)) };
}
