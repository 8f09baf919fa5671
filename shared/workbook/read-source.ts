import {
  KINDS,
  type Kind,
  type SourceBatch,
  type SourceLine,
  type SourceRow,
  type WorkbookNotice,
} from '#shared/records/types.ts';
import { findHeader } from './find-header.ts';
import { parseKeywords } from './keywords.ts';
import {
  LAYOUT,
  layoutByName,
  nameKey,
  type SheetLayout,
  TEMPLATE_VERSION,
  TEMPLATE_VERSIONS,
} from './layout.ts';
import { notice } from './notices.ts';
import { readBatchSheet } from './read-batch-sheet.ts';
import { readRows } from './read-rows.ts';
import type { Sheet, Workbook } from './types.ts';

/** Sheets of the template that hold nothing to read. */
const OWN_SHEETS = new Set(['guide', 'lists']);

const text = (value: unknown): string | null => (typeof value === 'string' && value !== '' ? value : null);
const isKind = (record: string): record is Kind => KINDS.some((kind) => kind === record);

function versionNotices(batch: SourceRow, workbook: Workbook): WorkbookNotice[] {
  const keywords = parseKeywords(workbook.keywords);
  const version = text(batch.values['templateVersion']) ?? keywords.template;
  const pairs = [
    ['templateVersion', keywords.template],
    ['workOrder', keywords.workOrder],
  ] as const;
  const differ = pairs.flatMap(([field, kept]) => {
    const written = text(batch.values[field]);
    if (kept === null || written === null || kept === written) return [];
    const address = batch.cells[field]?.address ?? null;
    return [notice('workbook-keywords-differ', { sheet: batch.sheet, address }, { field, written, kept })];
  });
  const place = { sheet: batch.sheet, address: batch.cells['templateVersion']?.address ?? null };
  if (version === null || version === TEMPLATE_VERSION) return differ;
  const known = TEMPLATE_VERSIONS.includes(version);
  const code = known ? 'workbook-template-old' : 'workbook-template-unknown';
  return [...differ, notice(code, place, { version, current: TEMPLATE_VERSION })];
}

type Known = { readonly sheet: Sheet; readonly layout: SheetLayout };

/** Fewer known headings than this are chance. */
const ALIKE = 4;

/** The template's sheet whose headings a sheet of another name has; null when it has none. */
function sheetLike(sheet: Sheet, system: { readonly date1904: boolean }): string | null {
  const known = LAYOUT.filter(({ record }) => record !== 'batch').map((layout) => ({
    name: layout.name,
    count: findHeader(layout, sheet.rows, system)?.columns.size ?? 0,
  }));
  const best = known.reduce((most, one) => (one.count > most.count ? one : most));
  return best.count < ALIKE ? null : best.name;
}

function sortSheets(workbook: Workbook): { known: Known[]; notices: WorkbookNotice[] } {
  const known: Known[] = [];
  const notices: WorkbookNotice[] = [];
  for (const sheet of workbook.sheets) {
    const layout = sheet.kind === 'worksheet' ? layoutByName(sheet.name) : null;
    if (sheet.kind !== 'worksheet') {
      notices.push(notice('workbook-sheet-not-read', { sheet: sheet.name }, { kind: sheet.kind }));
    } else if (layout !== null) known.push({ sheet, layout });
    else if (!OWN_SHEETS.has(nameKey(sheet.name)) && sheet.rows.length > 0) {
      const like = sheetLike(sheet, workbook);
      notices.push(
        like === null
          ? notice('workbook-sheet-unknown', { sheet: sheet.name }, { hidden: sheet.hidden })
          : notice('workbook-sheet-renamed', { sheet: sheet.name }, { like }),
      );
    }
  }
  return { known, notices };
}

/**
 * Cells to source rows by the layout of this and earlier template versions. Every filled cell of a known column becomes a value or a
 * problem; a row in which only prefilled cells are filled is no line. Nothing is judged here.
 */
export function readSource(workbook: Workbook): SourceBatch {
  const { known, notices } = sortSheets(workbook);
  const batchSheet = known.find(({ layout }) => layout.record === 'batch')?.sheet ?? null;
  const batch = readBatchSheet(batchSheet, workbook);
  if (batchSheet === null) notices.push(notice('workbook-sheet-missing', { sheet: 'Batch' }));
  notices.push(...versionNotices(batch, workbook));

  const columns: Record<string, Readonly<Record<string, string>>> = {};
  const lines: SourceLine[] = [];
  const others = { pour: [] as SourceRow[], event: [] as SourceRow[], photo: [] as SourceRow[] };
  for (const { layout, sheet } of known) {
    const { record } = layout;
    if (record === 'batch') continue;
    const read = readRows(layout, sheet, workbook);
    notices.push(...read.notices);
    columns[layout.name] = read.columns;
    if (isKind(record)) {
      for (const row of read.rows) {
        lines.push({ ...row, kind: record, structureNumber: text(row.values['structureNumber']) ?? '' });
      }
    } else others[record].push(...read.rows);
  }
  if (lines.length === 0) notices.push(notice('workbook-no-lines'));
  return {
    batch,
    lines,
    pours: others.pour,
    events: others.event,
    photos: others.photo,
    notices,
    templateVersion: text(batch.values['templateVersion']) ?? parseKeywords(workbook.keywords).template,
    columns,
  };
}
