import type { Row, SheetInfo } from '#shared/workbook/types.ts';
import { WorkbookRefused } from '#shared/workbook/workbook-refused.ts';
import { findMainPart } from './main-part.ts';
import type { PartSource } from './part-source.ts';
import { type Budget, readSheet } from './read-sheet.ts';
import { readSharedStrings } from './read-shared-strings.ts';
import {
  readDateStyles,
  readKeywords,
  readRelationships,
  readWorkbookPart,
  type Relationship,
  type SheetEntry,
} from './read-small-parts.ts';
import { relationshipsPart, resolveTarget } from './resolve-target.ts';

/** What the reader hands on, in order: one `begin`, then rows and merged ranges of each sheet. */
export type WorkbookEvent =
  | {
      readonly type: 'begin';
      readonly date1904: boolean;
      readonly keywords: string | null;
      readonly sheets: readonly SheetInfo[];
    }
  | { readonly type: 'rows'; readonly sheet: number; readonly rows: readonly Row[] }
  | { readonly type: 'merged'; readonly sheet: number; readonly ranges: readonly string[] };

const SHEET_KINDS: Readonly<Record<string, SheetInfo['kind']>> = {
  worksheet: 'worksheet',
  chartsheet: 'chart',
  dialogsheet: 'dialog',
  xlMacrosheet: 'macro',
  xlIntlMacrosheet: 'macro',
};

type Place = { readonly info: SheetInfo; readonly part: string };

function placeSheet(entry: SheetEntry, relationships: Map<string, Relationship>, main: string): Place {
  const relationship = relationships.get(entry.relationship);
  const kind = SHEET_KINDS[relationship?.type ?? ''];
  if (relationship === undefined || kind === undefined) {
    throw new WorkbookRefused('part-missing', { sheet: entry.name });
  }
  return {
    info: { name: entry.name, hidden: entry.hidden, kind },
    part: resolveTarget(main, relationship.target),
  };
}

/** Reads a workbook part by part. Throws WorkbookRefused when it is damaged, over a limit or no workbook. */
export async function* readPackage(parts: PartSource): AsyncGenerator<WorkbookEvent> {
  const { main, core } = await findMainPart(parts);
  const { date1904, sheets } = await readWorkbookPart(main, parts.open(main));
  if (sheets.length === 0) throw new WorkbookRefused('not-a-workbook');
  const rels = relationshipsPart(main);
  if (!parts.has(rels)) throw new WorkbookRefused('part-missing', { part: rels });
  const relationships = await readRelationships(rels, parts.open(rels));
  const places = sheets.map((entry) => placeSheet(entry, relationships, main));
  const keywords = core !== null && parts.has(core) ? await readKeywords(core, parts.open(core)) : null;
  yield { type: 'begin', date1904, keywords, sheets: places.map((place) => place.info) };

  const byType = (type: string): string | null => {
    const found = [...relationships.values()].find((one) => one.type === type);
    if (found === undefined) return null;
    const part = resolveTarget(main, found.target);
    if (parts.has(part)) return part;
    // Some writers name styles and leave them out: times are then told by their size. Texts cannot be done without.
    if (type === 'styles') return null;
    throw new WorkbookRefused('part-missing', { part });
  };
  const stringsPart = byType('sharedStrings');
  const stylesPart = byType('styles');
  const tables = {
    strings: stringsPart === null ? [] : await readSharedStrings(stringsPart, parts.open(stringsPart)),
    dateStyles: stylesPart === null ? [] : await readDateStyles(stylesPart, parts.open(stylesPart)),
  };
  const budget: Budget = { rows: 0, cells: 0, characters: 0, merged: 0 };
  for (const [sheet, { info, part }] of places.entries()) {
    if (info.kind !== 'worksheet') continue;
    if (!parts.has(part)) throw new WorkbookRefused('part-missing', { sheet: info.name });
    try {
      for await (const read of readSheet(
        { sheet: info.name, part, chunks: parts.open(part) },
        tables,
        budget,
      )) {
        if ('rows' in read) yield { type: 'rows', sheet, rows: read.rows };
        else yield { type: 'merged', sheet, ranges: read.merged };
      }
    } catch (error) {
      // Whoever opens the workbook knows its sheets, not its parts.
      if (!(error instanceof WorkbookRefused) || 'sheet' in error.params) throw error;
      throw new WorkbookRefused(error.code, { ...error.params, sheet: info.name });
    }
  }
}
