import { describeRule } from '../describe-rule.ts';
import { gapShallow } from './rule.ts';

const kind = 'straighten' as const;

describeRule(gapShallow, {
  valid: [
    { name: 'half of it', line: { kind, values: { gapDepthFt: 3, embedmentFt: 6 } } },
    { name: 'depth unreadable', line: { kind, values: { embedmentFt: 6 }, broken: ['gapDepthFt'] } },
  ],
  invalid: [
    {
      // Half of 6 ft. u(h) 0.5 in: U = 2 × 0.5/12 ft.
      name: 'a third of it',
      line: { kind, values: { gapDepthFt: 2, embedmentFt: 6 } },
      expected: [{ measured: 2, limit: 3, margin: -1, unit: 'ft', uncertainty: 0.0833333333333 }],
    },
    {
      name: 'embedment not known',
      line: { kind, values: { gapDepthFt: 2 } },
      expected: [{ unproved: 'embedmentFt' }],
    },
  ],
});
