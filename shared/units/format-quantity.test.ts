import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { cToF, fToC, ft3ToL, ftToM, inToMm, lToFt3, mToFt, mmToIn } from './convert.ts';
import { formatNumber, formatQuantity, unitWord } from './format-quantity.ts';

describe('a quantity in words', () => {
  test.each([
    [5.8, 'ft', '5.8 ft'],
    [5.8333333, 'ft', '5.83 ft'],
    [-3, 'in', '−3 in'],
    [9.5, 'ft3', '9.50 ft³'],
    [0.9785, 'ratio', '0.98'],
    [1, 'ratio', '1.00'],
    [0.5, 'in-per-10ft', '0.5 in per 10 ft'],
    [0.125, 'in-per-ft', '0.125 in per ft'],
    [72, 'degF', '72 °F'],
    [-93.26501, 'deg', '−93.26501°'],
    [1000, 'px', '1,000 px'],
    [1234567.891, 'ft', '1,234,567.89 ft'],
    [7, 'count', '7'],
    [22.5, 'min', '22.5 min'],
    [-0.001, 'ft', '0 ft'],
    [3, 'furlong', '3 furlong'],
  ])('%d %s', (value, unit, text) => {
    expect(formatQuantity(value, unit)).toBe(text);
  });

  test.each([
    [6, 'ft', '1.829 m'],
    [18, 'in', '457 mm'],
    [8.6701, 'ft3', '245.5 L'],
    [72, 'degF', '22.2 °C'],
    [1, 'in-per-10ft', '8.3 mm per m'],
    [3, 'min', '3 min'],
    [1.0957, 'ratio', '1.10'],
  ])('%d %s in metric', (value, unit, text) => {
    expect(formatQuantity(value, unit, { metric: true })).toBe(text);
  });

  test('as many digits as asked for', () => {
    expect(formatQuantity(0.99964, 'ratio', { digits: 4 })).toBe('0.9996');
    expect(formatNumber(1.005, { digits: 2, fixed: true })).toBe('1.01');
    expect(formatNumber(Number.NaN)).toBe('–');
  });

  test('the word alone, as a title carries it', () => {
    expect(['ft', 'ft3', 'in-per-10ft', 'ratio', 'degF'].map((unit) => unitWord(unit))).toEqual([
      'ft',
      'ft³',
      'in per 10 ft',
      '',
      '°F',
    ]);
    expect(unitWord('in', { metric: true })).toBe('mm');
  });
});

test('conversions lead back', () => {
  fc.assert(
    fc.property(fc.double({ min: -1e6, max: 1e6, noNaN: true }), (value) => {
      const slack = 1e-9 * Math.max(1, Math.abs(value));
      for (const back of [
        mToFt(ftToM(value)),
        mmToIn(inToMm(value)),
        lToFt3(ft3ToL(value)),
        cToF(fToC(value)),
      ])
        expect(Math.abs(back - value)).toBeLessThanOrEqual(slack);
    }),
  );
});

test('a number reads as what was rounded', () => {
  fc.assert(
    fc.property(fc.double({ min: -1e7, max: 1e7, noNaN: true }), (value) => {
      const read = Number(formatNumber(value, { digits: 3 }).replace('−', '-').replaceAll(',', ''));
      expect(Math.abs(read - value)).toBeLessThanOrEqual(0.000_500_1);
    }),
  );
});
