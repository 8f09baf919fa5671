import { describe, expect, it } from 'vitest';
import { LAYOUT, sheetLayout } from './layout.ts';
import { readSource } from './read-source.ts';
import type { Cell, Row, Sheet, Workbook } from './types.ts';
import { cellAddress } from './xml/cell-address.ts';

type Input = string | number | boolean | null | Partial<Cell>;

function cellOf(row: number, column: number, input: Exclude<Input, null>): Cell {
  const at = { address: cellAddress(row, column), column };
  if (typeof input === 'object') return { ...at, kind: 'text', raw: '', ...input };
  if (typeof input === 'number') return { ...at, kind: 'number', raw: String(input), number: input };
  if (typeof input === 'boolean') return { ...at, kind: 'boolean', raw: input ? 'TRUE' : 'FALSE' };
  return { ...at, kind: 'text', raw: input };
}

/** A sheet from rows of inputs, from row 1; null cells and empty rows are left out as the reader leaves them out. */
function sheetOf(name: string, lines: readonly (readonly Input[])[], more: Partial<Sheet> = {}): Sheet {
  const rows = lines.map((line, index): Row => ({
    row: index + 1,
    cells: line.flatMap((input, at) => (input === null ? [] : [cellOf(index + 1, at + 1, input)])),
  }));
  return {
    name,
    kind: 'worksheet',
    hidden: false,
    merged: [],
    rows: rows.filter((row) => row.cells.length > 0),
    ...more,
  };
}

const BATCH = sheetOf('Batch', [
  ['workOrder', 'Work order', 'WO-7'],
  ['contractor', 'Contractor', 'Pike Line'],
  ['foreman', 'Foreman', 'Jo'],
  ['templateVersion', 'Template version', 2],
]);
const workbook = (sheets: readonly Sheet[], more: Partial<Workbook> = {}): Workbook => ({
  date1904: false,
  keywords: null,
  sheets: [BATCH, ...sheets],
  ...more,
});
const KEYS = ['structureNumber', 'poleLengthFt', 'boreTopIn', 'waterIn', 'setAt'];
const TITLES = ['Structure number *', 'Pole length (ft) *', 'Bore at top (in) *', 'Water (in) *', 'Set *'];
const HINTS = [
  'As on the work order.',
  'Whole length, butt to top.',
  'Diameter at grade.',
  null,
  'When the pole stood in the bore.',
];
const LINE = ['12', 45, '18 1/2', 'not measured', '2026-04-14 10:24'];
const VALUES = {
  structureNumber: '12',
  poleLengthFt: 45,
  boreTopIn: 18.5,
  waterIn: 'not-measured',
  setAt: '2026-04-14T10:24',
};
const codes = (book: Workbook): string[] => readSource(book).notices.map((one) => one.code);

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
