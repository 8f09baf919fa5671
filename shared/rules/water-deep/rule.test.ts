import { expect, it } from 'vitest';
import { DEMO_CONTEXT } from '#shared/check/demo-context.ts';
import { describeRule } from '../describe-rule.ts';
import { eventOf, lineOf } from '../testing.ts';
import { waterDeep } from './rule.ts';

describeRule(waterDeep, {
  valid: [
    { name: 'dry', line: { values: { waterIn: 0 }, derived: { waterWithPoleIn: 0 } } },
    {
      name: 'at the limit with the pole in',
      line: { values: { waterIn: 1.1 }, derived: { waterWithPoleIn: 2 } },
    },
    {
      name: 'at the limit in a later event',
      line: { values: { waterIn: 0 }, events: [eventOf('set', 2, { waterIn: 2 })] },
    },
    { name: 'unreadable', line: { broken: ['waterIn'] } },
    { name: 'level with the pole not known, open level within', line: { values: { waterIn: 1 } } },
  ],
  invalid: [
    {
      name: 'an inch in the open bore is more with the pole in',
      // 18 in bore, 12 in butt: 1.2 in open stands at 2.16 in.
      line: { values: { waterIn: 1.2 }, derived: { waterWithPoleIn: 2.16 } },
      expected: [{ measured: 2.16, limit: 2, margin: -0.16, unit: 'in', params: { waterIn: 1.2 } }],
    },
    {
      name: 'too deep even in the open bore',
      line: { values: { waterIn: 5 } },
      expected: [{ measured: 5, limit: 2, margin: -3 }],
    },
    {
      name: 'deeper than the bore: it cannot rise past grade, and the readings are told',
      // 6 ft are 72 in.
      line: { values: { waterIn: 100, boreDepthFt: 6 }, derived: { waterWithPoleIn: 72 } },
      expected: [{ measured: 72, limit: 2, margin: -70, params: { waterIn: 100, boreIn: 72 } }],
    },
    {
      name: 'found by a later event',
      line: {
        values: { waterIn: 0 },
        derived: { waterWithPoleIn: 0 },
        events: [eventOf('set', 2, { waterIn: 3 })],
      },
      expected: [{ measured: 3, limit: 2, margin: -1, part: 'event 2' }],
    },
    {
      name: 'not measured',
      line: { values: { waterIn: 'not-measured' } },
      expected: [{ unproved: 'waterIn' }],
    },
  ],
});

it('water as deep as the bore is full, not more than it holds', () => {
  // 6 ft are 72 in.
  const line = lineOf({ values: { waterIn: 72, boreDepthFt: 6 }, derived: { waterWithPoleIn: 72 } });
  const [found] = waterDeep.check(line, { limitIn: 2 }, DEMO_CONTEXT);
  expect(found?.params).toEqual({ waterIn: 72, event: 1 });
});
