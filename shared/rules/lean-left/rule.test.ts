import { describeRule } from '../describe-rule.ts';
import { eventOf } from '../testing.ts';
import { leanLeft } from './rule.ts';

const kind = 'straighten' as const;

describeRule(leanLeft, {
  valid: [
    { name: 'plumb', line: { kind, values: { leanAfterInPer10Ft: 0 } } },
    { name: 'at the limit', line: { kind, values: { leanAfterInPer10Ft: 1, leanAfterAzimuthDeg: 90 } } },
    { name: 'not recorded: lean-unproved says so', line: { kind } },
    { name: 'not measured', line: { kind, values: { leanAfterInPer10Ft: 'not-measured' } } },
    {
      name: 'direction missing',
      line: { kind, values: { leanAfterInPer10Ft: 3 }, broken: ['leanAfterAzimuthDeg'] },
    },
    {
      name: 'pulled again',
      line: {
        kind,
        values: { leanAfterInPer10Ft: 3, leanAfterAzimuthDeg: 90 },
        events: [eventOf(kind, 2, { leanInPer10Ft: 0.1 })],
      },
    },
  ],
  invalid: [
    {
      name: 'sprang back',
      line: { kind, values: { leanAfterInPer10Ft: 2.5, leanAfterAzimuthDeg: 90 } },
      expected: [{ field: 'leanAfterInPer10Ft', measured: 2.5, limit: 1, margin: -1.5, unit: 'in-per-10ft' }],
    },
    {
      // Rake 2 to the east, lean 1 to the west: 3 apart.
      name: 'leans away from its rake',
      line: {
        kind,
        values: {
          leanAfterInPer10Ft: 1,
          leanAfterAzimuthDeg: 270,
          designRakeInPer10Ft: 2,
          designRakeAzimuthDeg: 90,
        },
      },
      expected: [{ measured: 3, limit: 1, margin: -2 }],
    },
    {
      name: 'its own direction not said',
      line: { kind, values: { leanAfterInPer10Ft: 2 } },
      expected: [{ unproved: 'leanAfterAzimuthDeg' }],
    },
    {
      name: 'left so by an event, its direction not said',
      line: { kind, events: [eventOf(kind, 2, { leanInPer10Ft: 2 })] },
      expected: [{ unproved: 'leanAzimuthDeg' }],
    },
  ],
});
