import { formatCount } from '#src/lib/formats.ts';

/** The server stops counting here. */
const COUNT_LIMIT = 10_000;

type Counted = {
  readonly rows: readonly unknown[];
  readonly total: number | null;
  readonly isPending: boolean;
  readonly error: Error | null;
};

/** How many rows a list has: `214`, or `more than 10,000` where the server stopped counting. */
export function totalText(list: Counted): string {
  if (list.isPending) return '…';
  if (list.total !== null) return formatCount(list.total);
  return list.error && list.rows.length === 0 ? '–' : `more than ${formatCount(COUNT_LIMIT)}`;
}

/** `Rows 1 to 100 of 214`. */
export function rowsText(list: Counted): string {
  if (list.isPending) return 'Loading';
  if (list.rows.length === 0) return list.error ? 'Not loaded' : 'No rows';
  return `Rows 1 to ${formatCount(list.rows.length)} of ${totalText(list)}`;
}
