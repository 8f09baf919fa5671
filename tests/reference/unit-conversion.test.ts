import { expect, test } from 'vitest';
import { L_PER_FT3, METRIC, fToC, ft3ToL, ftToM, inToMm } from '#shared/units/convert.ts';

// Source: 16 CFR 500.19, conversion factors (defined values). Status: read.
test('inch and foot', () => {
  expect(inToMm(1)).toBe(25.4);
  expect(ftToM(1)).toBe(0.3048);
});

// Source: NIST SP 811, appendix B: follows from 1 in = 25.4 mm. Status: derived.
test('cubic foot', () => {
  expect(L_PER_FT3).toBe(28.316846592);
  expect(Math.abs(ft3ToL(1) / (30.48 ** 3 / 1000) - 1)).toBeLessThan(1e-15);
});

// Source: 16 CFR 500.19, printed to six digits. Status: read.
test('cubic foot and cubic metre as printed', () => {
  expect(Math.abs(ft3ToL(1) / 1000 - 0.0283168)).toBeLessThan(5e-8);
  expect(Math.abs(1000 / L_PER_FT3 - 35.3147)).toBeLessThan(5e-5);
});

// Source: closed formula. Status: derived.
test('feet and inches, temperatures', () => {
  expect(ftToM(6 + 7.5 / 12)).toBeCloseTo(2.0193, 12);
  expect(fToC(68)).toBe(20);
  expect(fToC(40)).toBeCloseTo(4.44444444444, 9);
});

// Source: 25.4 mm over 3.048 m. Status: derived.
test('an inch per 10 ft is 8 1/3 mm per m', () => {
  expect(METRIC['in-per-10ft']?.convert(1)).toBeCloseTo(8.333333333, 9);
});
