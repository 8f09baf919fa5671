import { describeRule } from '../describe-rule.ts';
import { eventOf } from '../testing.ts';
import { leanUnproved } from './rule.ts';

const kind = 'straighten' as const;
const values = { leanBeforeInPer10Ft: 6, leanAfterInPer10Ft: 0 };

describeRule(leanUnproved, {
  valid: [
    { name: 'both recorded', line: { kind, values } },
    {
      name: 'unreadable',
      line: { kind, values: { leanBeforeInPer10Ft: 6 }, broken: ['leanAfterInPer10Ft'] },
    },
    {
      name: 'left by a later event',
      line: {
        kind,
        values: { leanBeforeInPer10Ft: 6 },
        events: [eventOf(kind, 2, { leanInPer10Ft: 0.2 })],
      },
    },
  ],
  invalid: [
    {
      name: 'not measured after',
      line: { kind, values: { ...values, leanAfterInPer10Ft: 'not-measured' } },
      expected: [{ field: 'leanAfterInPer10Ft', measured: 'not-measured', limit: null, margin: null }],
    },
    {
      name: 'both blank',
      line: { kind },
      expected: [
        { field: 'leanBeforeInPer10Ft', measured: null },
        { field: 'leanAfterInPer10Ft', measured: null },
      ],
    },
  ],
});
