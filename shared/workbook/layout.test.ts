import { describe, expect, it } from 'vitest';
import { LAYOUT, sheetLayout } from './layout.ts';

describe('the layout', () => {
  it('names no column of a sheet twice, over all versions', () => {
    for (const { columns } of LAYOUT) {
      const names = columns.flatMap((column) => [...column.names]);
      expect(names.length).toBe(new Set(names).size);
    }
  });

  it('has the sheets in the order of the template and the columns in the order of the record', () => {
    expect(LAYOUT.map((sheet) => sheet.name)).toEqual([
      'Batch',
      'Set',
      'Straighten',
      'Re-level',
      'Pours',
      'Events',
      'Photos',
    ]);
    expect(
      sheetLayout('relevel')
        .columns.slice(0, 3)
        .map((column) => column.heading),
    ).toEqual(['Structure number', 'Pad length (in)', 'Pad width (in)']);
  });
});
