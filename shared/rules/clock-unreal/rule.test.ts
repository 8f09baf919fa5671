import { describeRule } from '../describe-rule.ts';
import { eventOf, pourOf } from '../testing.ts';
import { clockUnreal } from './rule.ts';

// America/Chicago, IANA zones: 2026-03-08 02:00 to 03:00 did not happen, 2026-11-01 01:00 to 02:00 happened twice.
describeRule(clockUnreal, {
  valid: [
    { name: 'an ordinary time', line: { values: { setAt: '2026-04-14T09:30' }, pours: [pourOf()] } },
    { name: 'a word', line: { values: { hardwareAt: 'not-by-us' } } },
    { name: 'the minute after the gap', line: { values: { setAt: '2026-03-08T03:00' } } },
    {
      name: 'the same time in a zone without daylight saving',
      // lineOf reads times in Chicago; the rule asks the work order's zone again.
      line: { values: { setAt: '2026-03-08T02:30' } },
      context: { zone: 'America/Phoenix' },
    },
  ],
  invalid: [
    {
      name: 'in the gap',
      line: { values: { setAt: '2026-03-08T02:30' } },
      expected: [
        {
          field: 'setAt',
          measured: '2026-03-08T02:30',
          limit: null,
          margin: null,
          params: { problem: 'gap' },
        },
      ],
    },
    {
      name: 'a pour in the hour that came twice',
      line: { pours: [pourOf({ pouredAt: '2026-11-01T01:30' })] },
      expected: [{ field: 'pouredAt', measured: '2026-11-01T01:30', params: { problem: 'overlap' } }],
    },
    {
      name: 'a day that no calendar has',
      line: { kind: 'relevel', values: { loweredAt: '2026-02-30T10:00' } },
      expected: [{ field: 'loweredAt', params: { problem: 'unreal' } }],
    },
    {
      name: 'in an event',
      line: { events: [eventOf('set', 2, { beganAt: '2026-03-08T02:10' })] },
      expected: [{ field: 'beganAt', part: 'event 2', params: { problem: 'gap' } }],
    },
  ],
});
