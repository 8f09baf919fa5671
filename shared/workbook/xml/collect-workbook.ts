import type { Cell, Row, Sheet, Workbook } from '#shared/workbook/types.ts';
import { WorkbookRefused } from '#shared/workbook/workbook-refused.ts';
import type { WorkbookEvent } from './read-package.ts';

type Begin = Extract<WorkbookEvent, { type: 'begin' }>;

/** Rows of one number joined, rows and cells put in order: files need not keep either. */
function orderRows(name: string, rows: readonly Row[]): Row[] {
  const byNumber = new Map<number, Cell[]>();
  for (const { row, cells } of rows) {
    const earlier = byNumber.get(row);
    if (earlier) earlier.push(...cells);
    else byNumber.set(row, [...cells]);
  }
  return [...byNumber]
    .sort(([a], [b]) => a - b)
    .map(([row, cells]) => {
      cells.sort((a, b) => a.column - b.column);
      const twice = cells.find((cell, index) => cell.column === cells[index + 1]?.column);
      if (twice) throw new WorkbookRefused('cell-twice', { sheet: name, address: twice.address });
      return { row, cells };
    });
}

/** Gathers the reader's events into a workbook. */
export function createCollector(): { add: (event: WorkbookEvent) => void; finish: () => Workbook } {
  let begin: Begin | null = null;
  const rows = new Map<number, Row[]>();
  const merged = new Map<number, string[]>();
  return {
    add: (event) => {
      if (event.type === 'begin') {
        begin = event;
        return;
      }
      if (event.type === 'rows') {
        const list = rows.get(event.sheet) ?? [];
        for (const row of event.rows) list.push(row);
        rows.set(event.sheet, list);
        return;
      }
      merged.set(event.sheet, [...(merged.get(event.sheet) ?? []), ...event.ranges]);
    },
    finish: () => {
      if (begin === null) throw new WorkbookRefused('reader-failed');
      const { date1904, keywords, sheets } = begin as Begin;
      return {
        date1904,
        keywords,
        sheets: sheets.map((info, index): Sheet => ({
          ...info,
          rows: orderRows(info.name, rows.get(index) ?? []),
          merged: merged.get(index) ?? [],
        })),
      };
    },
  };
}
