import { describeRule } from '../describe-rule.ts';
import { embedmentShort } from './rule.ts';

// 40 ft pole in soil: 6 ft is due by the demo standard's table.
const derived = { dueFt: 6 };

describeRule(embedmentShort, {
  valid: [
    { name: 'exactly as due', line: { values: { embedmentFt: 6 }, derived } },
    { name: 'deeper', line: { values: { embedmentFt: 6.4 }, derived } },
    {
      name: 'short by less than binary arithmetic can tell',
      line: { values: { embedmentFt: 5.9999999999 }, derived },
    },
    {
      name: 'within a tolerance',
      line: { values: { embedmentFt: 5.8 }, derived },
      params: { toleranceFt: 0.2 },
    },
    { name: 'depth due not known', line: { values: { embedmentFt: 3 } } },
    { name: 'unreadable embedment has its own finding', line: { broken: ['embedmentFt'], derived } },
  ],
  invalid: [
    {
      name: 'half a foot short',
      line: { values: { embedmentFt: 5.5 }, derived },
      // U = 2 · 0.5 in = 1/12 ft
      expected: [{ measured: 5.5, limit: 6, margin: -0.5, unit: 'ft', uncertainty: 0.083333333333 }],
    },
    {
      name: 'beyond the tolerance',
      line: { values: { embedmentFt: 5.7 }, derived },
      params: { toleranceFt: 0.2 },
      expected: [{ measured: 5.7, limit: 5.8, margin: -0.1 }],
    },
    { name: 'blank', line: { derived }, expected: [{ unproved: 'embedmentFt' }] },
  ],
});
