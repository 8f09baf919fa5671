import XLSX from '@e965/xlsx';
import type { Workbook } from '#shared/workbook/types.ts';

export type Seen = Record<string, Record<string, string | number | boolean>>;

/** Filled cells by sheet and address as our reader sees them; errors by their text. */
export function ours(workbook: Workbook): Seen {
  return Object.fromEntries(
    workbook.sheets.map((sheet) => [
      sheet.name,
      Object.fromEntries(
        sheet.rows.flatMap(({ cells }) =>
          cells.map((cell) => [
            cell.address,
            cell.number ?? (cell.kind === 'boolean' ? cell.raw === 'TRUE' : cell.raw),
          ]),
        ),
      ),
    ]),
  );
}

/** The same as another reader sees it. */
export function theirs(bytes: Buffer): Seen {
  const book = XLSX.read(bytes, { cellDates: false });
  return Object.fromEntries(
    book.SheetNames.map((name) => [
      name,
      Object.fromEntries(
        Object.entries(book.Sheets[name] as Record<string, XLSX.CellObject>)
          .filter(([address, cell]) => !address.startsWith('!') && cell.t !== 'z')
          .map(([address, cell]) => [
            address,
            (cell.t === 'e' ? cell.w : cell.v) as string | number | boolean,
          ]),
      ),
    ]),
  );
}
