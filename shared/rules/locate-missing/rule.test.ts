import { describeRule } from '../describe-rule.ts';
import { locateMissing } from './rule.ts';

describeRule(locateMissing, {
  valid: [
    { name: 'given', line: { values: { locateTicket: 'LT-1' } } },
    { name: 'unreadable', line: { broken: ['locateTicket'] } },
  ],
  invalid: [
    { name: 'blank', line: {}, expected: [{ measured: null, limit: null, margin: null }] },
    {
      name: 'spaces',
      line: { kind: 'relevel', values: { locateTicket: '  ' } },
      expected: [{ measured: null }],
    },
  ],
});
