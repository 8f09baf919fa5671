import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Cell } from '#shared/workbook/types.ts';
import { readCell } from './read-cell.ts';
import type { ReadField, Reading } from './reading.ts';

const field = (read: string, more: Partial<ReadField> = {}): ReadField => ({
  key: 'x',
  read,
  unit: null,
  allowed: null,
  words: [],
  ...more,
});
const FEET = field('length-ft', { unit: 'ft' });
const INCHES = field('length-in', { unit: 'in' });
const LEAN = field('length-in', { unit: 'in-per-10ft' });
const KIT = field('number', { unit: 'ft3' });
const COUNT = field('integer', { unit: 'count' });
const TEMPERATURE = field('temperature-f', { unit: 'degF' });
const CLASS = field('code', { allowed: ['H1', '3', '10', 'other'] });
const TEXT = field('text');

const textCell = (raw: string): Cell => ({ address: 'A1', column: 1, kind: 'text', raw });
const numberCell = (number: number, more: Partial<Cell> = {}): Cell => ({
  address: 'A1',
  column: 1,
  kind: 'number',
  raw: String(number),
  number,
  ...more,
});
const SYSTEM = { date1904: false };

/** The value, or `why`, or the code of the problem. */
function short(reading: Reading): unknown {
  if ('value' in reading) return reading.value;
  return reading.problem.params['why'] ?? reading.problem.code;
}
const read = (raw: string, as: ReadField): unknown => short(readCell(textCell(raw), as, SYSTEM));

describe('lengths in feet', () => {
  // Literals by hand: 1 in is 1/12 ft.
  it.each([
    ['6.5', 6.5],
    [' 6.5\u00a0', 6.5],
    ['６．５', 6.5],
    ['1,200.5', 1200.5],
    ['6 1/2', 6.5],
    ['6½', 6.5],
    ["6'", 6],
    ['6 ft', 6],
    ['6.5 feet', 6.5],
    [`6'-6"`, 6.5],
    [`6' 6"`, 6.5],
    ['6’ 6”', 6.5],
    ['6′6″', 6.5],
    [`6' 6`, 6.5],
    ['6 ft 6 in', 6.5],
    ['6 ft. 6 in.', 6.5],
    ['6 ft 7 1/2 in', 6.625],
    [`5' 10 1/2''`, 5.875],
    [`-1' 6"`, -1.5],
    ['\u22126.5', -6.5],
    ['+6.5', 6.5],
    ['.5', 0.5],
    ['0', 0],
    ['-0', 0],
  ])('%s is %d', (raw, feet) => {
    expect(read(raw, FEET)).toBe(feet);
  });

  it.each([
    ['1.200,5', 'separators'],
    ['6,5', 'separators'],
    ['1,20', 'separators'],
    ['6..5', 'separators'],
    ['78 in', 'record-unit'],
    ['18"', 'record-unit'],
    ['2 m', 'record-unit'],
    ['6 yd', 'record-unit'],
    [`5' 14"`, 'inches'],
    [`5.5' 6"`, 'length'],
    ['6 3/2', 'fraction'],
    ['6 1/0', 'fraction'],
    ['about 6', 'length'],
    ['6 or 7', 'length'],
    ['6-7', 'length'],
    ['6²', 'length'],
    ['1e3', 'length'],
    ['0x10', 'length'],
    ['Infinity', 'length'],
    ['=6.5', 'length'],
    ['n/a', 'length'],
    ['-', 'length'],
    ['6 6', 'length'],
    ['٦', 'length'],
  ])('%s is not read: %s', (raw, why) => {
    expect(read(raw, FEET)).toBe(why);
  });
});

describe('lengths in inches', () => {
  it.each([
    ['18', 18],
    ['18.5', 18.5],
    ['18 1/2', 18.5],
    ['18-1/2', 18.5],
    ['18"', 18],
    ['18 in', 18],
    ['18 inches', 18],
    ['1/2', 0.5],
    ['-1/2"', -0.5],
    ['18 1/2"', 18.5],
  ])('%s is %d', (raw, inches) => {
    expect(read(raw, INCHES)).toBe(inches);
  });

  it.each([
    ['18 ft', 'record-unit'],
    ["1'", 'record-unit'],
    [`1' 6"`, 'record-unit'],
    ['450 mm', 'record-unit'],
    ['45 cm', 'record-unit'],
    ['18 °F', 'record-unit'],
    ['18 bananas', 'length'],
  ])('%s is not read: %s', (raw, why) => {
    expect(read(raw, INCHES)).toBe(why);
  });

  it('takes the words of a lean, not those of another', () => {
    expect(read('0.4 in per 10 ft', LEAN)).toBe(0.4);
    expect(read('3/8"', LEAN)).toBe(0.375);
    expect(read('0.4 in per ft', LEAN)).toBe('record-unit');
    expect(read('1 deg', LEAN)).toBe('record-unit');
  });
});

describe('numbers, counts and temperatures', () => {
  it.each([
    ['4', KIT, 4],
    ['2.5 ft³', KIT, 2.5],
    ['2.5 cu ft', KIT, 2.5],
    ['2.5 L', KIT, 'record-unit'],
    ['2', COUNT, 2],
    ['2.0', COUNT, 2],
    ['2 kits', COUNT, 2],
    ['2.5', COUNT, 'whole'],
    ['two', COUNT, 'number'],
    ['72', TEMPERATURE, 72],
    ['72 °F', TEMPERATURE, 72],
    ['72F', TEMPERATURE, 72],
    ['72°', TEMPERATURE, 72],
    ['\u22124', TEMPERATURE, -4],
    ['22 C', TEMPERATURE, 'record-unit'],
    ['22 °C', TEMPERATURE, 'record-unit'],
    ['warm', TEMPERATURE, 'temperature'],
    ['1.5%', KIT, 'record-unit'],
  ] as const)('%s', (raw, as, expected) => {
    expect(read(raw, as)).toBe(expected);
  });

  it('names the unit found and the unit of the column', () => {
    expect(readCell(textCell('18 ft'), INCHES, SYSTEM)).toEqual({
      problem: { code: 'record-unit', params: { found: 'ft', expected: 'in' } },
    });
  });
});

describe('degrees', () => {
  const latitude = field('degrees', { key: 'latitude', unit: 'deg' });
  const longitude = field('degrees', { key: 'longitude', unit: 'deg' });
  const azimuth = field('degrees', { key: 'leanAzimuthDeg', unit: 'deg' });
  it.each([
    ['38.94512', latitude, 38.94512],
    ['38.94512° N', latitude, 38.94512],
    ['N 38.5', latitude, 38.5],
    ['33.5 S', latitude, -33.5],
    ['92.4137 W', longitude, -92.4137],
    ['-92.4137', longitude, -92.4137],
    [`41° 15' 36" N`, latitude, 41.26],
    [`92° 30' W`, longitude, -92.5],
    ['275 deg', azimuth, 275],
    ['275 degrees', azimuth, 275],
    ['-92.4 W', longitude, 'hemisphere'],
    ['92.4 N', longitude, 'hemisphere'],
    ['NE', azimuth, 'degrees'],
    ['45 W', azimuth, 'hemisphere'],
    [`41° 75'`, latitude, 'degrees'],
    ['38,94512', latitude, 'separators'],
    ['north', azimuth, 'degrees'],
  ] as const)('%s', (raw, as, expected) => {
    expect(read(raw, as)).toBe(expected);
  });
});

describe('codes, words and text', () => {
  it.each([
    ['h1', CLASS, 'H1'],
    ['3', CLASS, '3'],
    [' Other ', CLASS, 'other'],
    ['8', CLASS, 'record-code'],
    ['soil over rock', field('code', { allowed: ['soil', 'soil-over-rock'] }), 'soil-over-rock'],
    ['SOIL', field('code', { allowed: ['soil', 'soil-over-rock'] }), 'soil'],
    ['Re-level', field('code', { allowed: ['relevel'] }), 'relevel'],
    ['constructor', CLASS, 'record-code'],
    ['not yet', field('clock', { words: ['not-yet', 'not-by-us'] }), 'not-yet'],
    ['Not by us.', field('clock', { words: ['not-yet', 'not-by-us'] }), 'not-by-us'],
    ['not measured', field('length-in', { unit: 'in', words: ['not-measured'] }), 'not-measured'],
    ['not measured', INCHES, 'word'],
    ['not yet', field('clock'), 'word'],
    ['  4471/12 ', TEXT, '4471/12'],
    ['=1+1', TEXT, '=1+1'],
    ['\u200b', TEXT, null],
    ['\u00a0 ', INCHES, null],
  ] as const)('%s', (raw, as, expected) => {
    expect(read(raw, as)).toBe(expected);
  });

  it('takes figures in text and code columns as they stand', () => {
    expect(short(readCell(numberCell(4471), TEXT, SYSTEM))).toBe('4471');
    expect(short(readCell(numberCell(0.1 + 0.2), TEXT, SYSTEM))).toBe('0.30000000000000004');
    expect(short(readCell(numberCell(3), CLASS, SYSTEM))).toBe('3');
    expect(short(readCell(numberCell(8), CLASS, SYSTEM))).toBe('record-code');
    // Sixteen digits: the spreadsheet has rounded what was typed.
    expect(short(readCell(numberCell(1_234_567_890_123_456), TEXT, SYSTEM))).toBe('digits-lost');
  });
});

describe('cells that are no plain value', () => {
  const cell = (kind: Cell['kind'], raw: string, more: Partial<Cell> = {}): Cell => ({
    ...textCell(raw),
    kind,
    ...more,
  });
  it('are problems in a number column, whatever they hold', () => {
    expect(short(readCell(cell('boolean', 'TRUE'), INCHES, SYSTEM))).toBe('boolean');
    expect(short(readCell(cell('date', '2026-04-14'), INCHES, SYSTEM))).toBe('date-for-number');
    // 1/2 typed into an ordinary cell is the second of January.
    expect(short(readCell(numberCell(46_024, { dateFormat: true }), INCHES, SYSTEM))).toBe('date-for-number');
    expect(short(readCell(numberCell(46_095, { dateFormat: true }), TEXT, SYSTEM))).toBe('date-for-text');
    expect(short(readCell(numberCell(2.5), COUNT, SYSTEM))).toBe('whole');
    expect(short(readCell(numberCell(18.5), INCHES, SYSTEM))).toBe(18.5);
  });

  it('say which error a formula gave, or that its result is not stored', () => {
    expect(readCell(cell('error', '#N/A', { formula: true }), INCHES, SYSTEM)).toEqual({
      problem: { code: 'record-formula', params: { error: '#N/A', formula: true } },
    });
    expect(readCell(cell('error', '', { formula: true }), TEXT, SYSTEM)).toEqual({
      problem: { code: 'record-formula', params: { error: '', formula: true } },
    });
  });
});

describe('texts beyond all measure', () => {
  it('are refused at once where a measure is expected, kept where a text is', () => {
    const long = `(${' '.repeat(100_000)}1'`;
    expect(read(long, FEET)).toBe('length');
    expect(read(`1${' 1'.repeat(50_000)}`, field('clock'))).toBe('clock');
    expect(read('9'.repeat(90_000), COUNT)).toBe('number');
    expect(read('x'.repeat(90_000), TEXT)).toBe('x'.repeat(90_000));
  });
});

describe('times', () => {
  const CLOCK = field('clock');
  const DAY = field('day');
  it.each([
    ['2026-04-14 10:24', '2026-04-14T10:24'],
    ['2026-04-14 9:05', '2026-04-14T09:05'],
    ['2026-04-14T09:05', '2026-04-14T09:05'],
    ['2026-04-14 10:24:59', '2026-04-14T10:24'],
    ['4/14/2026 10:24 AM', '2026-04-14T10:24'],
    ['4/14/2026 10:24 pm', '2026-04-14T22:24'],
    ['4/14/2026 12:05 AM', '2026-04-14T00:05'],
    ['4/14/2026 12:05 p.m.', '2026-04-14T12:05'],
    ['04/14/2026 16:05', '2026-04-14T16:05'],
    ['4/14/2026  10:24 AM', '2026-04-14T10:24'],
    ['2026-02-30 10:24', 'no-such-day'],
    ['14/4/2026 10:24', 'no-such-day'],
    ['2026-04-14', 'day-only'],
    ['10:24', 'time-only'],
    ['2026-04-14 25:00', 'clock'],
    ['2026-04-14 24:00', 'clock'],
    ['2026-04-14 10:60', 'clock'],
    ['4/14/2026 13:24 PM', 'clock'],
    ['4/14/26 10:24', 'clock'],
    ['14.04.2026 10:24', 'clock'],
    ['2026-04-14 10:24Z', 'clock'],
    ['April 14', 'clock'],
    ['yesterday', 'clock'],
  ])('%s', (raw, expected) => {
    expect(read(raw, CLOCK)).toBe(expected);
  });

  // Serials: 2026-04-14 is 46126 in the 1900 system and 44664 (1462 less) in the 1904 system; 10:24 is 624 of 1440 minutes.
  it('takes real date-times of both systems', () => {
    const time = { dateFormat: true, timeFormat: true };
    expect(short(readCell(numberCell(46_126 + 624 / 1440, time), CLOCK, SYSTEM))).toBe('2026-04-14T10:24');
    expect(short(readCell(numberCell(44_664 + 624 / 1440, time), CLOCK, { date1904: true }))).toBe(
      '2026-04-14T10:24',
    );
    expect(short(readCell(numberCell(46_126, time), CLOCK, SYSTEM))).toBe('2026-04-14T00:00');
    expect(short(readCell(numberCell(46_126, { dateFormat: true }), CLOCK, SYSTEM))).toBe('day-only');
    expect(short(readCell(numberCell(624 / 1440, time), CLOCK, SYSTEM))).toBe('time-only');
    expect(short(readCell(numberCell(46_126.5), CLOCK, SYSTEM))).toBe('2026-04-14T12:00');
  });

  it('takes no other number for a time', () => {
    for (const number of [1024, 10.24, 20_260_414, 4_142_026, -5]) {
      expect(short(readCell(numberCell(number), CLOCK, SYSTEM))).toBe('clock');
    }
  });

  it('takes ISO date cells', () => {
    const cell: Cell = { ...textCell('2026-04-14T10:24:00.000Z'), kind: 'date' };
    expect(short(readCell(cell, CLOCK, SYSTEM))).toBe('2026-04-14T10:24');
    expect(short(readCell(cell, DAY, SYSTEM))).toBe('2026-04-14');
  });

  it('takes days with or without a time', () => {
    expect(read('4/1/2026', DAY)).toBe('2026-04-01');
    expect(read('2026-04-01 10:00', DAY)).toBe('2026-04-01');
    expect(short(readCell(numberCell(46_126, { dateFormat: true }), DAY, SYSTEM))).toBe('2026-04-14');
    expect(read('2026-13-01', DAY)).toBe('no-such-day');
    expect(read('10:00', DAY)).toBe('time-only');
  });
});

describe('properties', () => {
  const halfInches = fc.integer({ min: 0, max: 480 });
  it('reads back feet and inches however they are written', () => {
    fc.assert(
      fc.property(
        halfInches,
        fc.constantFrom(`'`, ' ft', ' feet', '’'),
        fc.constantFrom('"', ' in', '”', ''),
        (halves, ft, inch) => {
          const feet = Math.floor(halves / 24);
          const inches = (halves % 24) / 2;
          const written = `${feet}${ft} ${Math.floor(inches)}${inches % 1 === 0 ? '' : ' 1/2'}${inch}`;
          expect(read(written, FEET)).toBeCloseTo(halves / 24, 12);
        },
      ),
    );
  });

  it('reads back numbers with thousands commas, units and blanks', () => {
    const parts = fc.tuple(fc.integer({ min: -999_999, max: 999_999 }), fc.integer({ min: 0, max: 99 }));
    fc.assert(
      fc.property(parts, fc.constantFrom('', ' in', '"', '\u00a0'), ([whole, cents], unit) => {
        const number = Number(`${whole}.${String(cents).padStart(2, '0')}`);
        const written = number.toLocaleString('en-US', { minimumFractionDigits: 2 }) + unit;
        expect(read(written, INCHES)).toBe(number === 0 ? 0 : number);
      }),
    );
  });

  it('reads back wall-clock times in every form of the guide', () => {
    const minutes = fc.integer({ min: 0, max: 1439 });
    fc.assert(
      fc.property(
        minutes,
        fc.integer({ min: 1, max: 28 }),
        fc.integer({ min: 1, max: 12 }),
        (minute, date, month) => {
          const two = (n: number): string => String(n).padStart(2, '0');
          const [hour, rest] = [Math.floor(minute / 60), two(minute % 60)];
          const wall = `2026-${two(month)}-${two(date)}T${two(hour)}:${rest}`;
          const half = `${hour % 12 === 0 ? 12 : hour % 12}:${rest} ${hour < 12 ? 'AM' : 'PM'}`;
          expect(read(`2026-${two(month)}-${two(date)} ${hour}:${rest}`, field('clock'))).toBe(wall);
          expect(read(`${month}/${date}/2026 ${half}`, field('clock'))).toBe(wall);
        },
      ),
    );
  });

  const readers = [
    FEET,
    INCHES,
    LEAN,
    KIT,
    COUNT,
    TEMPERATURE,
    field('degrees'),
    field('clock'),
    field('day'),
  ];
  it('never makes a number of a text without a digit, and never throws', () => {
    fc.assert(
      fc.property(fc.string({ unit: 'grapheme' }), fc.constantFrom(...readers), (raw, as) => {
        const reading = readCell(textCell(raw), as, SYSTEM);
        const number = 'value' in reading && reading.value !== null;
        expect(number && !/[\p{N}]/u.test(raw)).toBe(false);
      }),
    );
  });

  it('keeps the digits: a number read from junk around digits holds what the text says', () => {
    // A letter that belongs to no unit, anywhere in the text, is never read over.
    const letters = fc.constantFrom('x', 'q', '?', '~', 'k', '*', '€', '|');
    fc.assert(
      fc.property(
        fc.string(),
        letters,
        fc.string(),
        fc.constantFrom(...readers),
        (before, letter, after, as) => {
          const reading = readCell(textCell(`${before}1${letter}2${after}`), as, SYSTEM);
          expect('problem' in reading).toBe(true);
        },
      ),
    );
  });
});
