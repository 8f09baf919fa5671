import { describeRule } from '../describe-rule.ts';
import { eventOf } from '../testing.ts';
import { crownLow } from './rule.ts';

describeRule(crownLow, {
  valid: [
    { name: 'at grade', line: { values: { foamTopBelowGradeIn: 0 } } },
    { name: 'crowned', line: { values: { foamTopBelowGradeIn: -2 } } },
    {
      name: 'topped up later',
      line: {
        values: { foamTopBelowGradeIn: 6 },
        events: [eventOf('set', 2, { foamTopBelowGradeIn: 0 })],
      },
    },
    { name: 'unreadable', line: { broken: ['foamTopBelowGradeIn'] } },
  ],
  invalid: [
    {
      name: 'three inches low',
      line: { values: { foamTopBelowGradeIn: 3 } },
      expected: [{ measured: 3, limit: 0, margin: -3, unit: 'in' }],
    },
    {
      name: 'still low after a top-up that left a level; a later event that says none leaves it',
      line: {
        values: { foamTopBelowGradeIn: 6 },
        events: [eventOf('set', 2, { foamTopBelowGradeIn: 1 }), eventOf('set', 3, {})],
      },
      expected: [{ measured: 1, limit: 0, margin: -1, params: { event: 2 } }],
    },
  ],
});
