import { describeRule } from '../describe-rule.ts';
import { embedmentDeep } from './rule.ts';

const derived = { dueFt: 6 };

describeRule(embedmentDeep, {
  valid: [
    { name: 'as due', line: { values: { embedmentFt: 6 }, derived } },
    { name: 'at the allowance', line: { values: { embedmentFt: 7.5 }, derived } },
    { name: 'depth due not known', line: { values: { embedmentFt: 12 } } },
  ],
  invalid: [
    {
      name: 'two feet too deep',
      line: { values: { embedmentFt: 8 }, derived },
      expected: [{ measured: 8, limit: 7.5, margin: -0.5, unit: 'ft', params: { dueFt: 6 } }],
    },
  ],
});
