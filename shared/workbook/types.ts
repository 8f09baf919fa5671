/** What the reader hands on: cells exactly as the file says, nothing interpreted. */
export type CellKind = 'number' | 'text' | 'boolean' | 'error' | 'date';

export type Cell = {
  /** Like `H9`, always present (derived where the file omits it). */
  readonly address: string;
  /** 1-based column. */
  readonly column: number;
  readonly kind: CellKind;
  /** The text as it stands in the file after entity and `_xHHHH_` decoding. */
  readonly raw: string;
  readonly number?: number;
  /** The cell holds a formula; `raw` is its cached result. */
  readonly formula?: boolean;
  /** The cell's number format shows dates or times. */
  readonly dateFormat?: boolean;
  /** The cell's number format shows hours, so a whole serial is a midnight and not a bare day. */
  readonly timeFormat?: boolean;
};

export type Row = { readonly row: number; readonly cells: readonly Cell[] };

export type SheetInfo = {
  readonly name: string;
  readonly kind: 'worksheet' | 'chart' | 'macro' | 'dialog';
  readonly hidden: boolean;
};

export type Sheet = SheetInfo & { readonly rows: readonly Row[]; readonly merged: readonly string[] };

export type Workbook = {
  readonly date1904: boolean;
  readonly sheets: readonly Sheet[];
  /** docProps/core.xml keywords, where template version and work order also stand. */
  readonly keywords: string | null;
};
