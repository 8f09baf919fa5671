import { describe, expect, it } from 'vitest';
import { readSource } from './read-source.ts';
import { sheetOf, workbook, KEYS, TITLES, HINTS, LINE, VALUES, codes } from './sheets-for-tests.ts';

describe('notices', () => {
  it('name unknown columns and keep them; a heading is never a key', () => {
    const rows = [
      [...KEYS, '__proto__', 'constructor'],
      [...TITLES, 'Crew note', ''],
      [],
      [...LINE, 'x', 'y', 'stray'],
    ];
    const source = readSource(workbook([sheetOf('Set', rows)]));
    expect(
      source.notices.map(({ code, address, params }) => [
        code,
        address,
        params['heading'] ?? params['field'],
      ]),
    ).toEqual([
      ['workbook-column-missing', null, 'poleClass'],
      ['workbook-column-missing', null, 'poleMaterial'],
      ['workbook-column-missing', null, 'boreDepthFt'],
      ['workbook-column-missing', null, 'ground'],
      ['workbook-column-missing', null, 'embedmentFt'],
      ['workbook-column-missing', null, 'foamTopBelowGradeIn'],
      ['workbook-column-missing', null, 'leanInPer10Ft'],
      ['workbook-column-missing', null, 'boredAt'],
      ['workbook-column-missing', null, 'latitude'],
      ['workbook-column-missing', null, 'longitude'],
      ['workbook-column-unknown', 'F1', '__proto__'],
      ['workbook-column-unknown', 'G1', 'constructor'],
      ['workbook-column-unknown', null, ''],
    ]);
    const [line] = source.lines;
    expect(line?.values).toEqual(VALUES);
    expect(line?.cells['column F']).toEqual({ address: 'F4', raw: 'x' });
    expect(line?.cells['column H']).toEqual({ address: 'H4', raw: 'stray' });
    expect(Object.getPrototypeOf(line?.cells)).toBe(Object.prototype);
  });

  it('report a column that is there twice', () => {
    const source = readSource(
      workbook([
        sheetOf('Set', [
          [...KEYS, 'boreTopIn'],
          [...LINE, 30],
        ]),
      ]),
    );
    expect(source.lines[0]?.values['boreTopIn']).toBe(18.5);
    expect(source.notices.find((one) => one.code === 'workbook-column-twice')).toMatchObject({
      severity: 'nonconformity',
      address: 'F1',
      params: { field: 'boreTopIn' },
    });
  });

  it('report a sheet whose headings are gone', () => {
    expect(codes(workbook([sheetOf('Set', [LINE, LINE])]))).toEqual([
      'workbook-header-missing',
      'workbook-no-lines',
    ]);
  });

  it('name foreign sheets, leave the template’s own in peace', () => {
    const sheets = [
      sheetOf('Guide', [['x']]),
      sheetOf('Lists', [['x']], { hidden: true }),
      sheetOf('Sheet1', [['x']]),
      sheetOf('Chart', [], { kind: 'chart' }),
      sheetOf('Set', [KEYS, LINE]),
    ];
    const { notices } = readSource(workbook(sheets));
    const foreign = notices.filter((one) => one.code.startsWith('workbook-sheet'));
    expect(foreign.map(({ code, sheet }) => [code, sheet])).toEqual([
      ['workbook-sheet-unknown', 'Sheet1'],
      ['workbook-sheet-not-read', 'Chart'],
    ]);
  });

  it('tell a sheet of the template that has another name from a foreign one', () => {
    const { notices, lines } = readSource(workbook([sheetOf('Poles', [KEYS, LINE])]));
    expect(lines).toEqual([]);
    expect(notices.filter((one) => one.code !== 'workbook-no-lines')).toMatchObject([
      { code: 'workbook-sheet-renamed', severity: 'nonconformity', sheet: 'Poles', params: { like: 'Set' } },
    ]);
  });

  it('note merged cells among the data, not in the headings', () => {
    const sheet = sheetOf('Set', [KEYS, TITLES, HINTS, LINE], { merged: ['A1:B1', 'C4:C5'] });
    const merged = readSource(workbook([sheet])).notices.filter((one) => one.code === 'workbook-merged');
    expect(merged).toMatchObject([{ address: 'C4', params: { range: 'C4:C5', more: 0 } }]);
  });

  it('compare the Batch sheet with the core properties', () => {
    const set = sheetOf('Set', [KEYS, LINE]);
    const of = (keywords: string | null) =>
      readSource(workbook([set], { keywords })).notices.filter(
        (one) => one.code === 'workbook-keywords-differ',
      );
    expect(of('template=2; workOrder=WO-7')).toEqual([]);
    expect(of(null)).toEqual([]);
    expect(of('holiday photos')).toEqual([]);
    expect(of('template=2; workOrder=WO-8')).toMatchObject([
      { severity: 'query', address: 'C1', params: { field: 'workOrder', written: 'WO-7', kept: 'WO-8' } },
    ]);
    expect(of('template=1; workOrder=WO-7')).toMatchObject([
      { params: { field: 'templateVersion', written: '2', kept: '1' } },
    ]);
  });

  it('tell an older template from one that is not known', () => {
    const version = (text: string): string[] => {
      const batch = sheetOf('Batch', [
        ['Work order', 'WO-7'],
        ['Template version', text],
      ]);
      return codes({ date1904: false, keywords: null, sheets: [batch] });
    };
    expect(version('1')).toEqual(['workbook-template-old', 'workbook-no-lines']);
    expect(version('7')).toEqual(['workbook-template-unknown', 'workbook-no-lines']);
    expect(version('2')).toEqual(['workbook-no-lines']);
  });

  it('report a missing Batch sheet', () => {
    const source = readSource({ date1904: false, keywords: null, sheets: [] });
    expect(source.notices.map((one) => one.code)).toEqual(['workbook-sheet-missing', 'workbook-no-lines']);
    expect(source.batch.values).toEqual({});
  });
});
