import { expect, it } from 'vitest';
import { rowsText, totalText } from '#src/lib/formats-list.ts';

const list = (change: object) => ({ rows: [], total: null, isPending: false, error: null, ...change });

it.each([
  [{ isPending: true }, '…', 'Loading'],
  [{ total: 0 }, '0', 'No rows'],
  [{ total: 1214, rows: [1, 2] }, '1,214', 'Rows 1 to 2 of 1,214'],
  [{ rows: [1, 2] }, 'more than 10,000', 'Rows 1 to 2 of more than 10,000'],
  [{ error: new Error('no') }, '–', 'Not loaded'],
])('%j', (change, total, rows) => {
  expect([totalText(list(change)), rowsText(list(change))]).toEqual([total, rows]);
});
