import { describeRule } from '../describe-rule.ts';
import { locateLapsed } from './rule.ts';

const ticket = { locateTicket: 'LT-1', locateFrom: '2026-04-10', locateTo: '2026-04-24' };

describeRule(locateLapsed, {
  valid: [
    { name: 'within its days', line: { values: { ...ticket, boredAt: '2026-04-14T09:00' } } },
    { name: 'on its first day', line: { values: { ...ticket, boredAt: '2026-04-10T00:05' } } },
    { name: 'on its last day, late', line: { values: { ...ticket, boredAt: '2026-04-24T23:50' } } },
    {
      name: 'no ticket: locate-missing says so',
      line: { values: { boredAt: '2026-05-14T09:00', locateTo: '2026-04-24' } },
    },
    { name: 'day of work not known', line: { values: ticket } },
    {
      name: 'end unreadable',
      line: { values: { ...ticket, locateTo: null, boredAt: '2026-05-14T09:00' }, broken: ['locateTo'] },
    },
    {
      name: 'bored within, set after it ended',
      line: { values: { ...ticket, boredAt: '2026-04-24T16:00', setAt: '2026-04-25T08:00' } },
    },
  ],
  invalid: [
    {
      name: 'three days after its end',
      line: { values: { ...ticket, boredAt: '2026-04-27T09:00' } },
      expected: [
        {
          field: 'locateTo',
          measured: '2026-04-27',
          limit: '2026-04-24',
          margin: -3,
          unit: 'd',
          params: { end: 'ended', days: 3 },
        },
      ],
    },
    {
      name: 'the day before it begins',
      line: { kind: 'straighten', values: { ...ticket, pulledAt: '2026-04-09T09:00' } },
      expected: [
        {
          field: 'locateFrom',
          measured: '2026-04-09',
          limit: '2026-04-10',
          margin: -1,
          params: { end: 'begins' },
        },
      ],
    },
    {
      name: 'its days left blank',
      line: { kind: 'relevel', values: { locateTicket: 'LT-1', raisedAt: '2026-04-14T13:00' } },
      expected: [{ unproved: 'locateFrom' }, { unproved: 'locateTo' }],
    },
  ],
});
