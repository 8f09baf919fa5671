import { READER_LIMITS } from '#shared/workbook/limits.ts';
import type { Cell, Row } from '#shared/workbook/types.ts';
import { WorkbookRefused } from '#shared/workbook/workbook-refused.ts';
import { cellAddress, LAST_COLUMN, LAST_ROW, parseAddress } from './cell-address.ts';
import { cellValue, type CellTables, type RawCell } from './cell-value.ts';
import { decodeEscapes } from './decode-escapes.ts';
import { attribute, parseXml, type XmlTag } from './parse-xml.ts';

/** Counts over all sheets of one workbook. */
export type Budget = { rows: number; cells: number; characters: number; merged: number };

export type SheetPart = {
  readonly sheet: string;
  readonly part: string;
  readonly chunks: AsyncIterable<Uint8Array>;
};

type OpenCell = { -readonly [K in keyof RawCell]: RawCell[K] } & { row: number; column: number; run: string };

/** Characters of the longest range of cells, `XFD1048576:XFD1048576`. */
const LONGEST_RANGE = 21;

/** Rows of one worksheet in the order of the file, handed on chunk by chunk; at the end the merged ranges. Blank cells and rows are left out. */
export async function* readSheet(
  { sheet, part, chunks }: SheetPart,
  tables: CellTables,
  budget: Budget,
): AsyncGenerator<{ rows: Row[] } | { merged: string[] }> {
  let rows: Row[] = [];
  const merged: string[] = [];
  let row = 0;
  let column = 0;
  let cells: Cell[] = [];
  let cell: OpenCell | null = null;

  const endRow = (): void => {
    if (cells.length === 0) return;
    if (++budget.rows > READER_LIMITS.rows)
      throw new WorkbookRefused('too-many-rows', { sheet, limit: READER_LIMITS.rows });
    rows.push({ row, cells });
    cells = [];
  };
  const openRow = (tag: XmlTag): void => {
    const given = attribute(tag, 'r');
    row = given === undefined ? row + 1 : /^\d{1,7}$/.test(given.trim()) ? Number(given) : 0;
    if (row < 1 || row > LAST_ROW) {
      throw new WorkbookRefused('cell-address', { sheet, address: given ?? String(row) });
    }
    column = 0;
  };
  const openCell = (tag: XmlTag): void => {
    const given = attribute(tag, 'r');
    const place = given === undefined ? { row, column: column + 1 } : parseAddress(given.trim());
    if (place === null || place.column > LAST_COLUMN) {
      throw new WorkbookRefused('cell-address', { sheet, address: given ?? '' });
    }
    // A row without number whose cells carry one: the cells know better.
    if (place.row !== row) {
      endRow();
      row = place.row;
    }
    column = place.column;
    const style = attribute(tag, 's');
    cell = {
      type: attribute(tag, 't') ?? 'n',
      style: style === undefined ? null : Number(style),
      value: null,
      inline: null,
      formula: false,
      row,
      column,
      run: '',
    };
  };
  const closeCell = (done: OpenCell): void => {
    const address = cellAddress(done.row, done.column);
    const body = cellValue(done, tables, { sheet, address });
    if (body === null) return;
    budget.characters += body.raw.length;
    if (body.raw.length > READER_LIMITS.cellCharacters || budget.characters > READER_LIMITS.characters) {
      throw new WorkbookRefused('too-much-text', { sheet, address });
    }
    if (++budget.cells > READER_LIMITS.cells) {
      throw new WorkbookRefused('too-many-cells', { sheet, limit: READER_LIMITS.cells });
    }
    cells.push({ address, column: done.column, ...body, ...(done.formula ? { formula: true } : {}) });
  };

  const openMerged = (tag: XmlTag): void => {
    if (++budget.merged > READER_LIMITS.mergedRanges) {
      throw new WorkbookRefused('too-many-merged', { sheet, limit: READER_LIMITS.mergedRanges });
    }
    const range = attribute(tag, 'ref') ?? '';
    if (range.length <= LONGEST_RANGE) merged.push(range);
  };
  /** A second value of one cell: joined to the first it would be another number. */
  const openOnce = (open: OpenCell, name: 'value' | 'inline'): void => {
    if (open[name] !== null) {
      throw new WorkbookRefused('cell-twice', { sheet, address: cellAddress(open.row, open.column) });
    }
    open[name] = '';
  };

  let hasData = false;
  const steps = parseXml(part, chunks, {
    root: 'worksheet',
    open: (name, tag, parents) => {
      const parent = parents.at(-1);
      if (name === 'row' && parent === 'sheetData') openRow(tag);
      else if (name === 'c' && parent === 'row') openCell(tag);
      else if (name === 'mergeCell') openMerged(tag);
      else if (name === 'sheetData' && parents.length === 1) hasData = true;
      else if (cell === null) return;
      else if (name === 'v') openOnce(cell, 'value');
      else if (name === 'f') cell.formula = true;
      else if (name === 'is') openOnce(cell, 'inline');
      else if (name === 't') cell.run = '';
    },
    text: (text, path) => {
      if (cell === null) return;
      const name = path.at(-1);
      if (name === 'v') cell.value += text;
      else if (name === 't' && !path.includes('rPh')) cell.run += text;
    },
    close: (name, parents) => {
      if (name === 'row' && parents.at(-1) === 'sheetData') endRow();
      if (cell === null) return;
      if (name === 'c') {
        closeCell(cell);
        cell = null;
      } else if (name === 't' && !parents.includes('rPh') && cell.inline !== null) {
        cell.inline += decodeEscapes(cell.run);
        if (cell.inline.length > READER_LIMITS.cellCharacters) {
          throw new WorkbookRefused('too-much-text', { sheet, address: cellAddress(cell.row, cell.column) });
        }
      }
    },
  });
  while (!(await steps.next()).done) {
    if (rows.length > 0) yield { rows };
    rows = [];
  }
  // Every worksheet has this element, though it be empty: without it the part holds something else.
  if (!hasData) throw new WorkbookRefused('xml-damaged', { part, sheet });
  if (merged.length > 0) yield { merged };
}
