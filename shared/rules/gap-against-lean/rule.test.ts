import { describeRule } from '../describe-rule.ts';
import { gapAgainstLean } from './rule.ts';

const kind = 'straighten' as const;
/** From 8 in per 10 ft to plumb, 5 ft deep: 8 × 5 / 10 = 4 in. */
const values = {
  leanBeforeInPer10Ft: 8,
  leanBeforeAzimuthDeg: 90,
  leanAfterInPer10Ft: 0,
  gapAtGradeIn: 4,
  gapDepthFt: 5,
};

describeRule(gapAgainstLean, {
  valid: [
    { name: 'as opened', line: { kind, values } },
    { name: 'half as wide', line: { kind, values: { ...values, gapAtGradeIn: 2 } } },
    { name: 'twice as wide', line: { kind, values: { ...values, gapAtGradeIn: 8 } } },
    {
      name: 'lean after not measured: lean-unproved says so',
      line: { kind, values: { ...values, leanAfterInPer10Ft: 'not-measured', gapAtGradeIn: 20 } },
    },
    {
      name: 'direction unreadable',
      line: { kind, values: { ...values, gapAtGradeIn: 20 }, broken: ['leanBeforeAzimuthDeg'] },
    },
    {
      name: 'gap unreadable',
      line: { kind, values: { ...values, gapAtGradeIn: null }, broken: ['gapAtGradeIn'] },
    },
  ],
  invalid: [
    {
      name: 'too wide',
      line: { kind, values: { ...values, gapAtGradeIn: 9 } },
      expected: [{ measured: 9, limit: 8, margin: -1, unit: 'in', params: { expected: 4, change: 8 } }],
    },
    {
      name: 'too narrow',
      line: { kind, values: { ...values, gapAtGradeIn: 1.5 } },
      expected: [{ measured: 1.5, limit: 2, margin: -0.5, part: 'narrow' }],
    },
    {
      // From 6 to the east to 8 to the north: 10 apart; 10 × 5 / 10 = 5 in.
      name: 'the change is of vectors',
      line: {
        kind,
        values: {
          ...values,
          leanBeforeInPer10Ft: 6,
          leanAfterInPer10Ft: 8,
          leanAfterAzimuthDeg: 0,
          gapAtGradeIn: 11,
        },
      },
      expected: [{ measured: 11, limit: 10, margin: -1, part: 'wide' }],
    },
  ],
});
