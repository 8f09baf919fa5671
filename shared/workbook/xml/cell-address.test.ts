import fc from 'fast-check';
import { expect, it } from 'vitest';
import { cellAddress, columnLetters, LAST_COLUMN, LAST_ROW, parseAddress } from './cell-address.ts';

it('names columns as spreadsheets do', () => {
  expect([1, 26, 27, 52, 702, 703, 16_384].map(columnLetters)).toEqual([
    'A',
    'Z',
    'AA',
    'AZ',
    'ZZ',
    'AAA',
    'XFD',
  ]);
});

it('reads back every address it writes', () => {
  fc.assert(
    fc.property(
      fc.integer({ min: 1, max: LAST_ROW }),
      fc.integer({ min: 1, max: LAST_COLUMN }),
      (row, column) => {
        expect(parseAddress(cellAddress(row, column))).toEqual({ row, column });
      },
    ),
  );
});

it('knows no address beyond the sheet', () => {
  for (const address of ['XFE1', 'A1048577', 'A0', '1A', 'A', '$A$1', ''])
    expect(parseAddress(address)).toBeNull();
});
