import { describe, expect, it } from 'vitest';
import { readSource } from './read-source.ts';
import { type Input, sheetOf, workbook, KEYS, TITLES, HINTS, LINE, VALUES } from './sheets-for-tests.ts';

describe('rows to lines', () => {
  it('reads by keys, with each cell’s address and what stood there', () => {
    const source = readSource(workbook([sheetOf('Set', [KEYS, TITLES, HINTS, LINE])]));
    expect(source.batch.values).toEqual({
      workOrder: 'WO-7',
      contractor: 'Pike Line',
      foreman: 'Jo',
      templateVersion: '2',
    });
    expect(source.batch.cells['workOrder']).toEqual({ address: 'C1', raw: 'WO-7' });
    expect(source.templateVersion).toBe('2');
    expect(source.lines).toMatchObject([
      {
        kind: 'set',
        structureNumber: '12',
        sheet: 'Set',
        row: 4,
        values: VALUES,
        problems: [],
        cells: { boreTopIn: { address: 'C4', raw: '18 1/2' } },
      },
    ]);
  });

  it.each([
    ['without hints', [KEYS, TITLES, LINE], 3],
    ['directly under the keys', [KEYS, LINE], 2],
    ['by titles alone', [TITLES, LINE], 2],
    ['by titles and hints', [TITLES, HINTS, LINE], 3],
    ['below other rows', [['Crew B'], [], [], KEYS, TITLES, HINTS, [], LINE, []], 8],
  ] as const)('finds the data %s', (_, rows, row) => {
    const { lines } = readSource(workbook([sheetOf('Set', rows)]));
    expect(lines).toMatchObject([{ row, values: VALUES }]);
  });

  it('takes columns in any order, by key where there is one and by title elsewhere', () => {
    const rows = [
      ['boreTopIn', null, 'structureNumber', 'setAt', 'poleLengthFt'],
      ['Bore at top (in)', 'Water (in)', 'Structure number', 'Set', 'Pole length (ft)'],
      [],
      ['18 1/2', 'not measured', '12', '2026-04-14 10:24', 45],
    ];
    expect(readSource(workbook([sheetOf('Set', rows)])).lines).toMatchObject([{ values: VALUES }]);
  });

  it('knows titles and keys of an earlier template', () => {
    const rows = [
      ['Pole number', 'Pole length (ft)', 'Hole diameter (in)', 'Setting depth (ft)'],
      ['12', 45, 20, 6.5],
    ];
    const [line] = readSource(workbook([sheetOf('SET', rows)])).lines;
    expect(line?.values).toEqual({
      structureNumber: '12',
      poleLengthFt: 45,
      boreTopIn: 20,
      embedmentFt: 6.5,
    });
    const keyed = [
      ['poleNumber', 'holeDiameterIn'],
      ['Pole number', 'Hole diameter (in)'],
      ['', ''],
      ['12', 20],
    ];
    expect(readSource(workbook([sheetOf('Set', keyed)])).lines[0]?.values).toEqual({
      structureNumber: '12',
      boreTopIn: 20,
    });
  });

  it('makes no line of prefilled cells alone, nor of blanks', () => {
    const rows = [
      KEYS,
      TITLES,
      HINTS,
      ['12', 45],
      ['13', 45, ' ', { kind: 'text', raw: '', formula: true }],
      [],
      ['14', 45, 20],
    ];
    const { lines } = readSource(workbook([sheetOf('Set', rows as Input[][])]));
    expect(lines.map((line) => [line.structureNumber, line.row])).toEqual([['14', 7]]);
  });

  it('drops no filled cell: what cannot be read is a problem with its cell', () => {
    const bad: Input[] = ['12', '1.200,5', '18 ft', { kind: 'error', raw: '#N/A', formula: true }, true];
    const [line] = readSource(workbook([sheetOf('Set', [KEYS, TITLES, HINTS, bad])])).lines;
    expect(line?.values).toEqual({ structureNumber: '12' });
    expect(line?.problems.map(({ field, address, raw, code }) => [field, address, raw, code])).toEqual([
      ['poleLengthFt', 'B4', '1.200,5', 'record-unreadable'],
      ['boreTopIn', 'C4', '18 ft', 'record-unit'],
      ['waterIn', 'D4', '#N/A', 'record-formula'],
      ['setAt', 'E4', 'TRUE', 'record-unreadable'],
    ]);
  });

  it('keeps a line without a structure number', () => {
    const { lines } = readSource(workbook([sheetOf('Set', [KEYS, TITLES, HINTS, [null, 45, 20]])]));
    expect(lines).toMatchObject([{ structureNumber: '', values: { boreTopIn: 20 } }]);
  });

  it('shows dates as dates in what stood there, in both date systems', () => {
    // 2026-04-14 is 44664 in the 1904 system.
    const time = {
      kind: 'number',
      raw: '44664.5',
      number: 44_664.5,
      dateFormat: true,
      timeFormat: true,
    } as const;
    const book = workbook([sheetOf('Set', [KEYS, TITLES, HINTS, ['12', 45, 20, 0, time]])], {
      date1904: true,
    });
    const [line] = readSource(book).lines;
    expect(line?.values['setAt']).toBe('2026-04-14T12:00');
    expect(line?.cells['setAt']).toEqual({ address: 'E4', raw: '2026-04-14 12:00' });
  });

  it('reads pours, events and photographs; every filled row counts there', () => {
    const pours = [
      ['structureNumber', 'pourNumber', 'kitFt3'],
      ['Structure number', 'Pour number', 'Kit size (ft³)'],
      [],
      ['12', 1, 4],
      ['12', null, null],
    ];
    const photos = [
      ['File name', 'Structure number', 'View'],
      ['a.jpg', '12', 'Bore depth'],
    ];
    const events = [
      ['structureNumber', 'event', 'beganAt'],
      ['12', 2, '2026-05-01 9:00'],
    ];
    const source = readSource(
      workbook([sheetOf('Pours', pours), sheetOf('Photos', photos), sheetOf('Events', events)]),
    );
    expect(source.pours.map((pour) => pour.values)).toEqual([
      { structureNumber: '12', pourNumber: 1, kitFt3: 4 },
      { structureNumber: '12' },
    ]);
    expect(source.photos.map((photo) => photo.values)).toEqual([
      { fileName: 'a.jpg', structureNumber: '12', view: 'bore-depth' },
    ]);
    expect(source.events.map((event) => event.values)).toEqual([
      { structureNumber: '12', event: 2, beganAt: '2026-05-01T09:00' },
    ]);
  });
});
