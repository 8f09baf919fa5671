import { formatCount } from '#src/lib/formats.ts';

/** The server stops counting here. */
const COUNT_LIMIT = 10_000;

/** How many rows a list has: `214`, or `more than 10,000` where the server stopped counting. */
export function totalText(list: { readonly total: number | null; readonly isPending: boolean }): string {
  if (list.isPending) return '…';
  return list.total === null ? `more than ${formatCount(COUNT_LIMIT)}` : formatCount(list.total);
}

/** `Rows 1 to 100 of 214`. */
export function rowsText(list: {
  readonly rows: readonly unknown[];
  readonly total: number | null;
  readonly isPending: boolean;
}): string {
  if (list.isPending) return 'Loading';
  if (list.rows.length === 0) return 'No rows';
  return `Rows 1 to ${formatCount(list.rows.length)} of ${totalText(list)}`;
}
