import { describeRule } from '../describe-rule.ts';
import { doneTwice } from './rule.ts';

describeRule(doneTwice, {
  valid: [
    { name: 'once', line: {} },
    { name: 'approved siblings of other structures', line: {}, context: { siblings: new Set(['set|S-2']) } },
    { name: 'number unreadable', line: { occurrence: 2, broken: ['structureNumber'] } },
  ],
  invalid: [
    {
      name: 'the second line',
      line: { occurrence: 2 },
      expected: [{ measured: 2, limit: 1, margin: -1, unit: 'count' }],
    },
    {
      name: 'approved in an earlier revision',
      line: {},
      context: { siblings: new Set(['set|S-1']) },
      expected: [{ measured: 2, limit: 1, margin: -1, params: { approved: true } }],
    },
  ],
});
