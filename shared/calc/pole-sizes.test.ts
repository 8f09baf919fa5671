import { describe, expect, test } from 'vitest';
import { girthAgainstDiameterIn, poleSizes } from './pole-sizes.ts';

const pole = { poleMaterial: 'southern-pine', poleLengthFt: 40, poleClass: '4', embedmentFt: 6 };

describe('sizes at ground line and butt', () => {
  test('girth counts where girth and diameter are both given', () => {
    const sizes = poleSizes({
      ...pole,
      girthGroundLineIn: 31.4159265359,
      diameterGroundLineIn: 12,
      diameterButtIn: 11,
    });
    expect(sizes?.groundLine.source).toBe('girth');
    expect(sizes?.groundLine.sizeIn).toBeCloseTo(10, 9);
    expect(sizes?.butt).toEqual({ sizeIn: 11, source: 'diameter' });
    expect(sizes?.taped).toBe(true);
  });

  // 40 ft class 4: girth taper (33.5 − 21)/34 = 0.367647 in per ft, over 6 ft 2.205882 in, as a diameter 0.702154 in.
  test('one taped size gives the other by the table’s taper', () => {
    const fromTop = poleSizes({ ...pole, diameterGroundLineIn: 11 });
    expect(fromTop?.butt.source).toBe('taper');
    expect(fromTop?.butt.sizeIn).toBeCloseTo(11.702154, 5);
    const fromButt = poleSizes({ ...pole, diameterButtIn: 11.702154 });
    expect(fromButt?.groundLine.sizeIn).toBeCloseTo(11, 5);
    expect(fromTop?.taped && fromButt?.taped).toBe(true);
  });

  test.each([
    ['length', { ...pole, poleLengthFt: 42 }],
    ['class', { ...pole, poleClass: 'other' }],
    ['class of that length', { ...pole, poleClass: '7' }],
    ['species', { ...pole, poleMaterial: 'steel' }],
    ['section', { ...pole, poleSection: 'octagonal' }],
    ['embedment', { ...pole, embedmentFt: 'x' }],
  ])('the table lacks the %s: taped at both ends or not known', (_what, values) => {
    expect(poleSizes(values)).toBeNull();
    expect(poleSizes({ ...values, diameterGroundLineIn: 11 })).toBeNull();
    expect(poleSizes({ ...values, diameterGroundLineIn: 11, diameterButtIn: 12 })?.taped).toBe(true);
  });

  test('an unknown section is not taken as round', () => {
    expect(poleSizes({ ...pole, poleSection: 'oval' })).toBeNull();
  });
});

test('girth against diameter, as diameters', () => {
  expect(girthAgainstDiameterIn({ girthButtIn: 31.4159265359, diameterButtIn: 10.4 })).toBeCloseTo(0.4, 9);
  expect(girthAgainstDiameterIn({ girthButtIn: 31.4, diameterGroundLineIn: 12 })).toBeNull();
});
