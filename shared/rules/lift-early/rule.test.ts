import { describeRule } from '../describe-rule.ts';
import { pourOf } from '../testing.ts';
import { liftEarly } from './rule.ts';

const first = pourOf({ pouredAt: '2026-04-14T10:00' });
const second = (pouredAt: string, more = {}) => pourOf({ pourNumber: 2, pouredAt, ...more });

describeRule(liftEarly, {
  valid: [
    { name: 'one pour of two rows', line: { pours: [first, first] } },
    { name: 'after 3 min', line: { pours: [first, second('2026-04-14T10:03')] } },
    { name: 'another event', line: { pours: [first, second('2026-04-14T10:01', { event: 2 })] } },
    {
      name: 'a pour without a number',
      line: { pours: [first, pourOf({ pourNumber: null }, ['pourNumber'])] },
    },
    {
      name: 'the lift is cold, the pour before it was not',
      line: { pours: [first, second('2026-04-14T10:03', { componentATempF: 40 })] },
    },
  ],
  invalid: [
    {
      name: 'after 2 min',
      line: { pours: [first, second('2026-04-14T10:02')] },
      expected: [{ measured: 2, limit: 3, margin: -1, unit: 'min', params: { pourNumber: 2 } }],
    },
    {
      name: 'on a cold pour: 40 °F doubles the wait',
      line: {
        kind: 'relevel',
        pours: [pourOf({ componentBTempF: 40 }), second('2026-04-14T10:05')],
      },
      expected: [{ measured: 5, limit: 6, margin: -1, params: { factor: 2, coldestF: 40 } }],
    },
    {
      name: 'before the pour it stands on',
      line: { pours: [first, second('2026-04-14T09:58')] },
      expected: [{ measured: -2, limit: 3, margin: -5 }],
    },
  ],
});
