import { expect, it } from 'vitest';
import type { Row } from '#shared/workbook/types.ts';
import { packRow, unpackRow } from './pack-rows.ts';

it('gives every cell back as it was', () => {
  const row: Row = {
    row: 12,
    cells: [
      { address: 'A12', column: 1, kind: 'text', raw: 'x', formula: true },
      {
        address: 'C12',
        column: 3,
        kind: 'number',
        raw: '4.5E1',
        number: 45,
        dateFormat: true,
        timeFormat: true,
      },
      { address: 'AB12', column: 28, kind: 'boolean', raw: 'TRUE' },
      { address: 'AC12', column: 29, kind: 'error', raw: '', formula: true },
      { address: 'AD12', column: 30, kind: 'date', raw: '2026-04-14' },
    ],
  };
  expect(unpackRow(packRow(row))).toEqual(row);
  expect(unpackRow(JSON.parse(JSON.stringify(packRow(row))) as ReturnType<typeof packRow>)).toEqual(row);
});
