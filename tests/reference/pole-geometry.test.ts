import { expect, test } from 'vitest';
import { frustumVolume, frustumVolumeByGirths } from '#shared/calc/frustum.ts';
import { outOfRoundFrustumVolume } from '#shared/calc/out-of-round-frustum.ts';
import { boreProfile, boreVolume } from '#shared/calc/bore-profile.ts';
import { girthTaper, poleSizes } from '#shared/calc/pole-sizes.ts';
import { setSpace, setVoid } from '#shared/calc/set-space.ts';

const relative = (actual: number, expected: number) => Math.abs(actual / expected - 1);

// Source: computed by exact arithmetic from class-table girths. Status: derived.
test.each([
  {
    lengthFt: 25,
    poleClass: '5',
    c6: 25.5,
    ct: 19,
    depthFt: 5,
    taper: 0.342105263158,
    ground: 25.8421052632,
    butt: 27.5526315789,
    volume: 1.97007654484,
  },
  {
    lengthFt: 35,
    poleClass: '5',
    c6: 29,
    ct: 19,
    depthFt: 6,
    taper: 0.344827586207,
    ground: 29,
    butt: 31.0689655172,
    volume: 2.99220203292,
  },
  {
    lengthFt: 40,
    poleClass: '4',
    c6: 33.5,
    ct: 21,
    depthFt: 6,
    taper: 0.367647058824,
    ground: 33.5,
    butt: 35.7058823529,
    volume: 3.97147629143,
  },
  {
    lengthFt: 40,
    poleClass: '4',
    c6: 33.5,
    ct: 21,
    depthFt: 7,
    taper: 0.367647058824,
    ground: 33.1323529412,
    butt: 35.7058823529,
    volume: 4.58487429564,
  },
  {
    lengthFt: 45,
    poleClass: '4',
    c6: 35,
    ct: 21,
    depthFt: 6.5,
    taper: 0.358974358974,
    ground: 34.8205128205,
    butt: 37.1538461538,
    volume: 4.6535966691,
  },
  {
    lengthFt: 50,
    poleClass: '2',
    c6: 42,
    ct: 25,
    depthFt: 7,
    taper: 0.386363636364,
    ground: 41.6136363636,
    butt: 44.3181818182,
    volume: 7.14359901683,
  },
  {
    lengthFt: 55,
    poleClass: '2',
    c6: 43.5,
    ct: 25,
    depthFt: 7.5,
    taper: 0.377551020408,
    ground: 42.9336734694,
    butt: 45.7653061224,
    volume: 8.1548067696,
  },
  {
    lengthFt: 70,
    poleClass: '1',
    c6: 51,
    ct: 27,
    depthFt: 9,
    taper: 0.375,
    ground: 49.875,
    butt: 53.25,
    volume: 13.2279672599,
  },
  {
    lengthFt: 40,
    poleClass: 'H1',
    c6: 43.5,
    ct: 29,
    depthFt: 6,
    taper: 0.426470588235,
    ground: 43.5,
    butt: 46.0588235294,
    volume: 6.65049271529,
  },
])('straight taper, $lengthFt ft class $poleClass set $depthFt ft', (pole) => {
  const { lengthFt, poleClass, depthFt } = pole;
  const sizes = poleSizes({
    poleMaterial: 'southern-pine',
    poleLengthFt: lengthFt,
    poleClass,
    embedmentFt: depthFt,
  });
  expect(sizes?.taped).toBe(false);
  expect(
    relative(girthTaper({ girthAt6FtIn: pole.c6, girthTopIn: pole.ct }, lengthFt), pole.taper),
  ).toBeLessThan(1e-9);
  expect(relative((sizes?.groundLine.sizeIn ?? 0) * Math.PI, pole.ground)).toBeLessThan(1e-9);
  expect(relative((sizes?.butt.sizeIn ?? 0) * Math.PI, pole.butt)).toBeLessThan(1e-9);
  expect(
    relative(frustumVolumeByGirths(depthFt, pole.ground / 12, pole.butt / 12), pole.volume),
  ).toBeLessThan(1e-9);
});

// Source: computed by exact arithmetic. Status: derived.
test.each([
  { boreTopIn: 20, depthFt: 6, butt: 35.7058823529, ground: 33.5, bore: 13.08996939, voidFt3: 9.11849309853 },
  {
    boreTopIn: 24,
    depthFt: 7,
    butt: 44.3181818182,
    ground: 41.6136363636,
    bore: 21.9911485751,
    voidFt3: 14.8475495583,
  },
])(
  'void between a straight $boreTopIn in bore and a tapered pole',
  ({ boreTopIn, depthFt, butt, ground, bore, voidFt3 }) => {
    const values = {
      boreTopIn,
      boreDepthFt: depthFt,
      embedmentFt: depthFt,
      girthGroundLineIn: ground,
      girthButtIn: butt,
      foamTopBelowGradeIn: 0,
    };
    const profile = boreProfile(values);
    expect(relative(profile === null ? 0 : boreVolume(profile, 0, depthFt), bore)).toBeLessThan(1e-8);
    const space = setSpace(values, { foamFollowsGrade: false });
    expect(relative(space === null ? 0 : setVoid(space), voidFt3)).toBeLessThan(1e-8);
  },
);

// Source: University of Missouri School of Natural Resources, Cubic Log Volume, worked example of a cone's frustum. Status: read.
test('log of 16 ft, 10 and 12 in', () => {
  expect(Math.abs(frustumVolume(16, 10 / 12, 1) - 10.588)).toBeLessThan(0.0005);
});

// Source: closed formula by high-precision arithmetic. Status: derived.
test('frusta that are exact multiples of π', () => {
  expect(relative(frustumVolume(3, 2, 4), 21.9911485751)).toBeLessThan(1e-11);
  expect(relative(frustumVolume(10, 6, 6), 282.743338823)).toBeLessThan(1e-11);
  expect(relative(frustumVolume(4, 0, 6), 37.6991118431)).toBeLessThan(1e-11);
});

// Source: closed formula. Status: derived. A cylinder cut by sloping ground holds its area times the depth on the axis.
test('bore of 20 in on a slope, 6 ft on the low side and 7 on the high', () => {
  const values = {
    boreTopIn: 20,
    boreDepthFt: 6,
    embedmentFt: 6,
    diameterGroundLineIn: 10,
    diameterButtIn: 10,
    foamTopBelowGradeIn: 0,
    slopeRiseIn: 12,
  };
  const level = setSpace(values, { foamFollowsGrade: false });
  const sloped = setSpace(values, { foamFollowsGrade: true });
  if (level === null || sloped === null) throw new Error('the record is complete');
  // 14.1808001725 ft³ of bore less a 10 in pole cut the same way: a quarter of it.
  expect(relative(setVoid(sloped), 14.1808001725 * 0.75)).toBeLessThan(1e-10);
  expect(relative(setVoid(level), 13.08996939 * 0.75)).toBeLessThan(1e-9);
});

// Source: closed formula. Status: derived.
test('stepped bore, 24 in for 3 ft over 18 in for 4 ft', () => {
  const upper = outOfRoundFrustumVolume(3, { a: 2, b: 2 }, { a: 2, b: 2 });
  const lower = outOfRoundFrustumVolume(4, { a: 1.5, b: 1.5 }, { a: 1.5, b: 1.5 });
  expect(relative(upper + lower, 16.4933614313)).toBeLessThan(1e-11);
});

// Source: chart value as printed, common practice: 18 in bore, 6 ft deep, 12 in butt taken as a cylinder prints as 6 ft³.
test('18 in bore, 12 in butt, 6 ft', () => {
  expect(frustumVolume(6, 1.5, 1.5) - frustumVolume(6, 1, 1)).toBeCloseTo(5.8905, 4);
});
