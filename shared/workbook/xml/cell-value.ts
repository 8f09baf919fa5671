import type { Cell } from '#shared/workbook/types.ts';
import { WorkbookRefused } from '#shared/workbook/workbook-refused.ts';
import type { DateFormat } from './date-format.ts';
import { decodeEscapes } from './decode-escapes.ts';

/** What stands in one `<c>` of a sheet, before its type is looked at. */
export type RawCell = {
  readonly type: string;
  readonly style: number | null;
  /** Text of `<v>`; null when there is none. */
  readonly value: string | null;
  /** Joined runs of `<is>`; null when there is none. */
  readonly inline: string | null;
  readonly formula: boolean;
};

export type CellTables = { readonly strings: readonly string[]; readonly dateStyles: readonly DateFormat[] };

type CellBody = Pick<Cell, 'kind' | 'raw' | 'number' | 'dateFormat' | 'timeFormat'>;

const NUMBER = /^[+-]?(?:\d+\.?\d*|\.\d+)(?:[eE][+-]?\d+)?$/;

function numberBody(raw: RawCell, tables: CellTables): CellBody | null {
  const text = (raw.value ?? '').trim();
  if (text === '') return null;
  const number = NUMBER.test(text) ? Number(text) : Number.NaN;
  // Not a number in a number cell: the file is wrong there, and the person must look at that cell.
  if (!Number.isFinite(number)) return { kind: 'error', raw: text };
  // Style indexes out of range happen in real files; such a cell has no date format.
  const shows = (raw.style === null ? undefined : tables.dateStyles[raw.style]) ?? 'none';
  const format =
    shows === 'none' ? {} : { dateFormat: true, ...(shows === 'time' ? { timeFormat: true } : {}) };
  return { kind: 'number', raw: text, number, ...format };
}

/** What no store takes in a text (NUL, half of a surrogate pair) becomes a visible mark instead of a failure later. */
function storable(text: string): string {
  return text.replaceAll('\0', '\ufffd').replace(/\p{Surrogate}/gu, '\ufffd');
}

/** A cell's kind and text by its type; null when it is blank. A formula whose result was not stored is an error cell with empty text. */
export function cellValue(
  raw: RawCell,
  tables: CellTables,
  where: { sheet: string; address: string },
): CellBody | null {
  if (raw.inline !== null && raw.type !== 's') return { kind: 'text', raw: storable(raw.inline) };
  if (raw.value === null) return raw.formula ? { kind: 'error', raw: '' } : null;
  switch (raw.type) {
    case 's': {
      const index = raw.value.trim();
      if (index === '') return null;
      const text = /^\d+$/.test(index) ? tables.strings[Number(index)] : undefined;
      if (text === undefined) throw new WorkbookRefused('string-index', where);
      return { kind: 'text', raw: storable(text) };
    }
    case 'str':
    case 'inlineStr':
      return { kind: 'text', raw: storable(decodeEscapes(raw.value)) };
    case 'b': {
      const text = raw.value.trim().toLowerCase();
      if (text === '') return null;
      if (!/^(?:[01]|true|false)$/.test(text)) return { kind: 'error', raw: raw.value.trim() };
      return { kind: 'boolean', raw: text === '1' || text === 'true' ? 'TRUE' : 'FALSE' };
    }
    case 'e':
      return { kind: 'error', raw: raw.value.trim() };
    case 'd':
      return raw.value.trim() === '' ? null : { kind: 'date', raw: raw.value.trim() };
    case 'n':
      return numberBody(raw, tables);
    default:
      // No type of the format: nobody knows what its text stands for.
      return { kind: 'error', raw: storable(raw.value.trim()) };
  }
}
