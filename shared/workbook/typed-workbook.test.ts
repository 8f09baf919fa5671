import { describe, expect, it } from 'vitest';
import { readSource } from './read-source.ts';
import { typedWorkbook } from './typed-workbook.ts';

const LINE = {
  kind: 'set',
  values: {
    structureNumber: 'L-1',
    boreDepthFt: `5' 10"`,
    boreTopIn: '18 1/2',
    setAt: '4/14/2026 9:40 AM',
    loadAt: 'not yet',
    waterIn: 'deep',
    notes: '  ',
  },
  pours: [{ pourNumber: '1', quantity: '2', kitFt3: '8' }],
  batch: { workOrder: '17', contractor: 'Brindle', foreman: 'Dana Wells' },
} as const;

describe('a line typed in a form', () => {
  it('is read as a workbook’s row is: lengths, times and words in every form that a cell may have', () => {
    const { lines, notices, templateVersion } = readSource(typedWorkbook(LINE));
    expect(lines).toHaveLength(1);
    // 5 ft 10 in is 70 in, 5.8333 ft.
    expect(lines[0]).toMatchObject({
      kind: 'set',
      structureNumber: 'L-1',
      row: 4,
      values: { boreTopIn: 18.5, setAt: '2026-04-14T09:40', loadAt: 'not-yet' },
    });
    expect(lines[0]?.values['boreDepthFt']).toBeCloseTo(70 / 12, 12);
    expect(lines[0]?.values).not.toHaveProperty('notes');
    expect([notices, templateVersion]).toEqual([[], '2']);
  });

  it('keeps what cannot be read as a problem of its field, never as a number', () => {
    const { lines } = readSource(typedWorkbook(LINE));
    expect(lines[0]?.values).not.toHaveProperty('waterIn');
    expect(lines[0]?.problems).toMatchObject([{ field: 'waterIn', raw: 'deep' }]);
  });

  it('has its pours from row 4 down, under its own number', () => {
    const { pours, batch } = readSource(typedWorkbook(LINE));
    expect(pours).toMatchObject([
      { sheet: 'Pours', row: 4, values: { structureNumber: 'L-1', pourNumber: 1, quantity: 2, kitFt3: 8 } },
    ]);
    expect(batch.values).toMatchObject({ workOrder: '17', contractor: 'Brindle', foreman: 'Dana Wells' });
  });
});
