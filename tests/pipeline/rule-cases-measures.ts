import { kits, type RuleCase } from './rule-case.ts';

/** Each as in rule-cases.ts: what is measured on a set pole, a straightened one and a pad. */
export const MEASURE_CASES: readonly RuleCase[] = [
  {
    // (24.25 − 12)/2 = 6.125 in of 6; void some 14 ft³: two kits of 8.
    code: 'annulus-wide',
    fails: {
      values: { ...wideBore(24.25) },
      pours: kits(8, 8),
      expected: { measured: 6.125, limit: 6, margin: -0.125, unit: 'in', severity: 'query' },
    },
    passes: { values: { ...wideBore(24) }, pours: kits(8, 8) },
  },
  {
    code: 'plumb-out',
    fails: {
      values: { leanInPer10Ft: 1.1, leanAzimuthDeg: 45 },
      expected: { measured: 1.1, limit: 1, margin: -0.1, unit: 'in-per-10ft' },
    },
    passes: { values: { leanInPer10Ft: 1, leanAzimuthDeg: 45 } },
  },
  {
    // Girth 35 in: 35/π = 11.1408 in. 11.5 − 11.1408 = 0.3592; 11.375 − 11.1408 = 0.2342.
    code: 'size-differs',
    fails: {
      values: { diameterGroundLineIn: 11.5 },
      expected: { measured: 0.3592, limit: 0.25, margin: -0.1092, unit: 'in', severity: 'query' },
    },
    passes: { values: { diameterGroundLineIn: 11.375 } },
  },
  {
    // The work order plans class 4.
    code: 'design-differs',
    fails: {
      values: { poleClass: '3' },
      expected: { measured: '3', limit: '4', margin: null, severity: 'query' },
    },
    passes: { values: { poleClass: '4' } },
  },
  {
    code: 'lean-left',
    kind: 'straighten',
    fails: {
      values: { leanAfterInPer10Ft: 1.1, leanAfterAzimuthDeg: 90 },
      expected: { measured: 1.1, limit: 1, margin: -0.1, unit: 'in-per-10ft' },
    },
    passes: { values: { leanAfterInPer10Ft: 1, leanAfterAzimuthDeg: 90 } },
  },
  {
    code: 'lean-unproved',
    kind: 'straighten',
    fails: {
      values: { leanAfterInPer10Ft: 'not measured' },
      expected: { measured: 'not-measured', limit: null, margin: null, severity: 'query' },
    },
    passes: { values: { leanAfterInPer10Ft: 0 } },
  },
  {
    // Half of 9.1 ft is 4.55; the gap goes 4.5 ft down.
    code: 'gap-shallow',
    kind: 'straighten',
    fails: {
      values: { embedmentFt: 9.1 },
      expected: { measured: 4.5, limit: 4.55, margin: -0.05, unit: 'ft', severity: 'query' },
    },
    passes: { values: { embedmentFt: 9 } },
  },
  {
    // 4 in per 10 ft out over 4.5 ft opens 1.8 in, at most 3.6; 4.5 in per 10 ft opens 2.025, at most 4.05.
    code: 'gap-against-lean',
    kind: 'straighten',
    fails: {
      values: { leanBeforeInPer10Ft: 4, leanAfterInPer10Ft: 0 },
      expected: { measured: 4, limit: 3.6, margin: -0.4, unit: 'in', severity: 'query' },
    },
    passes: { values: { leanBeforeInPer10Ft: 4.5, leanAfterInPer10Ft: 0 } },
  },
  {
    // |3.25 + 2 − 2 − 2|/2 = 0.625; |3 + 2 − 2 − 2|/2 = 0.5.
    code: 'gap-plane',
    kind: 'relevel',
    fails: {
      values: { gap1In: 3.25 },
      expected: { measured: 0.625, limit: 0.5, margin: -0.125, unit: 'in', severity: 'query' },
    },
    passes: { values: { gap1In: 3 } },
  },
  {
    code: 'pad-slope',
    kind: 'relevel',
    fails: {
      values: { slopeAfterAlongInPerFt: -0.375 },
      expected: { measured: 0.375, limit: 0.25, margin: -0.125, unit: 'in-per-ft' },
    },
    passes: { values: { slopeAfterAlongInPerFt: -0.25 } },
  },
];

function wideBore(boreTopIn: number) {
  return {
    boreTopIn,
    girthGroundLineIn: null,
    girthButtIn: null,
    diameterGroundLineIn: 12,
    diameterButtIn: 12,
  };
}
