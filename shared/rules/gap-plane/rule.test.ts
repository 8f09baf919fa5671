import { describeRule } from '../describe-rule.ts';
import { gapPlane } from './rule.ts';

const kind = 'relevel' as const;
const gaps = (gap1In: number, gap2In: number, gap3In: number, gap4In: number) => ({
  gap1In,
  gap2In,
  gap3In,
  gap4In,
});

describeRule(gapPlane, {
  valid: [
    { name: 'tilted but flat: |1 + 3 − 2 − 2|/2 = 0', line: { kind, values: gaps(1, 2, 3, 2) } },
    { name: 'at the limit: |2 + 3 − 2 − 2|/2 = 0.5', line: { kind, values: gaps(2, 2, 3, 2) } },
    { name: 'a gap unreadable', line: { kind, values: { ...gaps(9, 0, 9, 0), gap4In: null } } },
  ],
  invalid: [
    {
      name: 'one corner off: |3 + 3 − 2 − 2|/2 = 1',
      line: { kind, values: gaps(3, 2, 3, 2) },
      expected: [{ measured: 1, limit: 0.5, margin: -0.5, unit: 'in' }],
    },
    {
      name: 'the other diagonal: |1 + 1 − 3 − 2|/2 = 1.5',
      line: { kind, values: gaps(1, 3, 1, 2) },
      expected: [{ measured: 1.5, limit: 0.5, margin: -1, params: { gaps: [1, 3, 1, 2] } }],
    },
  ],
});
