import { describe, expect, it } from 'vitest';
import type { Cell } from '#shared/workbook/types.ts';
import {
  field,
  FEET,
  INCHES,
  COUNT,
  CLASS,
  TEXT,
  numberCell,
  textCell,
  SYSTEM,
  short,
  read,
} from './cells-for-tests.ts';
import { readCell } from './read-cell.ts';

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
