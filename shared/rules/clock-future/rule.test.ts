import { describeRule } from '../describe-rule.ts';
import { eventOf, pourOf } from '../testing.ts';
import { clockFuture } from './rule.ts';

/** Noon of 2026-04-14 in Chicago (UTC − 5 h). */
const context = { asOfMs: Date.UTC(2026, 3, 14, 17) };

describeRule(clockFuture, {
  valid: [
    { name: 'past', line: { values: { setAt: '2026-04-14T09:00' }, pours: [pourOf()] }, context },
    { name: 'at the minute of hand-in', line: { values: { loadAt: '2026-04-14T12:00' } }, context },
    { name: 'not yet', line: { values: { loadAt: 'not-yet' } }, context },
    { name: 'hand-in not known here', line: { values: { setAt: '2036-04-14T09:00' } } },
  ],
  invalid: [
    {
      name: 'its title is the sheet’s',
      line: { values: { setAt: '2026-04-14T13:00' } },
      context,
      expected: [{ field: 'setAt', params: { title: 'Set' } }],
    },
    {
      name: 'an hour ahead',
      line: { values: { loadAt: '2026-04-14T13:00' } },
      context,
      expected: [
        {
          field: 'loadAt',
          measured: '2026-04-14T13:00',
          limit: '2026-04-14T12:00',
          margin: -60,
          unit: 'min',
        },
      ],
    },
    {
      name: 'a pour and an event of another year',
      line: {
        values: { setAt: '2026-04-14T09:00' },
        pours: [pourOf({ pouredAt: '2026-04-14T12:01' })],
        events: [eventOf('set', 2, { beganAt: '2026-04-15T12:00' })],
      },
      context,
      expected: [
        { field: 'pouredAt', measured: '2026-04-14T12:01', margin: -1 },
        { field: 'beganAt', measured: '2026-04-15T12:00', margin: -1440 },
      ],
    },
  ],
});
