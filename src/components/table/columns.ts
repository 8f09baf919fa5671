import type { ReactNode } from 'react';

/** A column of a list. Ids and sort keys are stable: they stand in addresses and in the kept choice of columns. */
export type DataColumn<Row> = {
  readonly id: string;
  readonly title: string;
  /** Said once in the head; figures below carry none. Follows the chosen unit system. */
  readonly unit?: string;
  readonly cell: (row: Row) => ReactNode;
  /** Figures are set to the right. */
  readonly figures?: boolean;
  /** Least width in rem; the list turns to cards where the visible columns do not fit. */
  readonly min: number;
  /** Share of what is left over; 0 keeps the least width. */
  readonly grow?: number;
  /** Key that the server sorts by. */
  readonly sort?: string;
  /** Not shown until chosen. */
  readonly off?: boolean;
  /** The thing itself: in bold, heads the card, cannot be hidden. */
  readonly main?: boolean;
};

const REM = 16;
const GAP_REM = 1.25;

/** Grid tracks of the visible columns. */
export function gridTracks(columns: readonly { min: number; grow?: number }[]): string {
  return columns
    .map(({ min, grow = 1 }) => `minmax(${min}rem, ${grow > 0 ? `${grow}fr` : `${min}rem`})`)
    .join(' ');
}

/** Whether the columns fit into `width` px side by side, gutters counted. */
export function columnsFit(columns: readonly { min: number }[], width: number): boolean {
  const least = columns.reduce((sum, column) => sum + column.min, 0) + GAP_REM * (columns.length + 1);
  return least * REM <= width;
}
