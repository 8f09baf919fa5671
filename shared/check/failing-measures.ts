import { expect } from 'vitest';
import { DEMO_CONTEXT } from './demo-context.ts';
import { DEMO_STANDARD } from '#shared/standard/demo.ts';
import { big, type Failing } from './failing-lines.ts';

const WITH_BRAND = {
  ...DEMO_STANDARD,
  rules: {
    ...DEMO_STANDARD.rules,
    'brand-differs': { ...DEMO_STANDARD.rules['brand-differs'], on: true },
  },
};

/** What is measured on a set pole, a straightened one and a pad. */
export const FAILING_MEASURES: readonly Failing[] = [
  {
    code: 'embedment-short',
    values: { embedmentFt: 5.75, boreDepthFt: 5.75 },
    expected: { measured: 5.75, limit: 6, margin: -0.25, unit: 'ft', field: 'embedmentFt' },
  },
  {
    code: 'embedment-deep',
    values: { embedmentFt: 8, boreDepthFt: 8 },
    pours: [{ ...big, quantity: 2 }],
    expected: { measured: 8, limit: 7.5, margin: -0.5 },
  },
  {
    code: 'bore-shallow',
    values: { boreDepthFt: 5.75 },
    expected: { measured: 5.75, limit: 5.9, margin: expect.closeTo(-0.15, 9), field: 'boreDepthFt' },
  },
  {
    code: 'annulus-narrow',
    values: { leastGapIn: 1.5 },
    expected: { measured: 1.5, limit: 2, margin: -0.5, field: 'leastGapIn' },
  },
  // WR-01: void 8.6701 ft³.
  {
    code: 'fill-short',
    pours: [big],
    expected: {
      measured: expect.closeTo(8 / 8.6701, 4),
      limit: 1,
      margin: expect.closeTo(8 / 8.6701 - 1, 4),
      unit: 'ratio',
    },
  },
  {
    code: 'fill-excess',
    pours: [{ ...big, quantity: 2 }],
    expected: {
      measured: expect.closeTo(16 / 8.6701, 4),
      limit: 1.5,
      margin: expect.closeTo(1.5 - 16 / 8.6701, 4),
    },
  },
  // WR-09: foam 6 in below grade, 8.5 ft³ in 7.9202 ft³.
  {
    code: 'crown-low',
    values: { foamTopBelowGradeIn: 6 },
    expected: { measured: 6, limit: 0, margin: -6, unit: 'in' },
  },
  // WR-08: 1.2 in of water in an open 18 in bore stands at 2.16 in round a 12 in butt.
  {
    code: 'water-deep',
    values: {
      waterIn: 1.2,
      boreTopIn: 18,
      girthGroundLineIn: null,
      girthButtIn: null,
      diameterGroundLineIn: 12,
      diameterButtIn: 12,
    },
    pours: [{ ...big, kitFt3: 6 }],
    context: { photos: null },
    expected: { measured: expect.closeTo(2.16, 3), limit: 2, margin: expect.closeTo(-0.16, 3), unit: 'in' },
  },
  // A 40 ft pole is branded 10 ft from the butt: 10 − 5 = 5 ft in the ground, not 6. Its photograph is due with the rule.
  {
    code: 'brand-differs',
    values: { brandHeightFt: 5 },
    context: {
      standards: [{ ...DEMO_CONTEXT.standards[0]!, body: WITH_BRAND }],
      photos: null,
    },
    expected: { measured: 1, limit: 0.5, margin: -0.5, unit: 'ft', field: 'brandHeightFt' },
  },
  // (24 − 11.75)/2; 16 ft³ for a void of some 14 ft³.
  {
    code: 'annulus-wide',
    values: {
      boreTopIn: 24,
      girthGroundLineIn: null,
      girthButtIn: null,
      diameterGroundLineIn: 11.75,
      diameterButtIn: 12,
    },
    pours: [{ ...big, quantity: 2 }],
    expected: { measured: 6.125, limit: 6, margin: -0.125, unit: 'in' },
  },
  {
    code: 'plumb-out',
    values: { leanInPer10Ft: 1.5, leanAzimuthDeg: 90 },
    expected: { measured: 1.5, limit: 1, margin: -0.5, unit: 'in-per-10ft' },
  },
  // Girth 35 in: 35/π = 11.1408 in.
  {
    code: 'size-differs',
    values: { diameterGroundLineIn: 12 },
    expected: { measured: expect.closeTo(0.859154, 6), limit: 0.25, margin: expect.closeTo(-0.609154, 6) },
  },
  {
    code: 'lean-left',
    kind: 'straighten',
    values: { leanAfterInPer10Ft: 1.25, leanAfterAzimuthDeg: 90 },
    expected: { measured: 1.25, limit: 1, margin: -0.25, unit: 'in-per-10ft' },
  },
  {
    code: 'lean-unproved',
    kind: 'straighten',
    values: { leanBeforeInPer10Ft: 'not-measured', leanBeforeAzimuthDeg: null },
    expected: { measured: 'not-measured', limit: null, margin: null, field: 'leanBeforeInPer10Ft' },
  },
  // Half of 10 ft.
  {
    code: 'gap-shallow',
    kind: 'straighten',
    values: { embedmentFt: 10 },
    expected: { measured: 4.5, limit: 5, margin: -0.5, unit: 'ft' },
  },
  // 18 and 0.2 without a direction: 18.2 in per 10 ft over 4.5 ft opens 8.19 in, half of it 4.095.
  {
    code: 'gap-against-lean',
    kind: 'straighten',
    values: { leanBeforeInPer10Ft: 18 },
    expected: { measured: 4, limit: expect.closeTo(4.095, 9), margin: expect.closeTo(-0.095, 9) },
  },
  // |4 + 2 − 2 − 2|/2.
  {
    code: 'gap-plane',
    kind: 'relevel',
    values: { gap1In: 4 },
    expected: { measured: 1, limit: 0.5, margin: -0.5, unit: 'in' },
  },
  {
    code: 'pad-slope',
    kind: 'relevel',
    values: { slopeAfterAcrossInPerFt: -0.375 },
    expected: { measured: 0.375, limit: 0.25, margin: -0.125, unit: 'in-per-ft' },
  },
];
