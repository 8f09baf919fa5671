import { describeRule } from '../describe-rule.ts';
import { eventOf, pourOf } from '../testing.ts';
import { clockOrder } from './rule.ts';

const day = (time: string) => `2026-04-14T${time}`;
const times = {
  boredAt: day('09:00'),
  setAt: day('09:30'),
  letGoAt: day('10:05'),
  hardwareAt: day('10:20'),
  loadAt: day('11:30'),
};
const pours = [pourOf({ pouredAt: day('10:00') })];

describeRule(clockOrder, {
  valid: [
    { name: 'in order', line: { values: times, pours } },
    { name: 'all at one time', line: { values: { boredAt: day('10:00'), setAt: day('10:00') }, pours } },
    {
      name: 'words and blanks are passed over',
      line: { values: { ...times, hardwareAt: 'not-yet', loadAt: null }, pours },
    },
    {
      name: 'a top-up after the line was loaded',
      line: {
        values: times,
        pours: [...pours, pourOf({ event: 2, pouredAt: '2026-05-02T08:30' })],
        events: [eventOf('set', 2, { beganAt: '2026-05-02T08:00' })],
      },
    },
  ],
  invalid: [
    {
      name: 'set before bored',
      line: { values: { ...times, setAt: day('08:45') }, pours },
      expected: [
        { field: 'setAt', measured: '2026-04-14T08:45', limit: '2026-04-14T09:00', margin: -15, unit: 'min' },
      ],
    },
    {
      name: 'poured before set',
      line: { values: times, pours: [pourOf({ pouredAt: day('09:20') })] },
      expected: [{ field: 'pouredAt', measured: day('09:20'), limit: day('09:30'), margin: -10 }],
    },
    {
      name: 'second pour before the first',
      line: { values: times, pours: [...pours, pourOf({ pourNumber: 2, pouredAt: day('09:50') })] },
      expected: [{ field: 'pouredAt', margin: -10, params: { before: 'pour 1', after: 'pour 2' } }],
    },
    {
      name: 'loaded the day before',
      line: { values: { ...times, loadAt: '2026-04-13T11:30' }, pours },
      expected: [{ field: 'loadAt', margin: -1370 }],
    },
    {
      name: 'straighten: released before the pour',
      line: {
        kind: 'straighten',
        values: { pulledAt: day('09:30'), releasedAt: day('09:55'), reattachedAt: day('11:00') },
        pours,
      },
      expected: [{ field: 'releasedAt', margin: -5 }],
    },
    {
      name: 're-level: released before lowered',
      line: {
        kind: 'relevel',
        values: { raisedAt: day('09:30'), loweredAt: day('10:30'), releasedAt: day('10:20') },
        pours,
      },
      expected: [{ field: 'releasedAt', margin: -10 }],
    },
    {
      name: 'rework poured before it began',
      line: {
        values: times,
        pours: [...pours, pourOf({ event: 2, pouredAt: '2026-05-02T08:30' })],
        events: [eventOf('set', 2, { beganAt: '2026-05-02T09:00' })],
      },
      expected: [{ field: 'pouredAt', margin: -30, params: { event: 2 } }],
    },
  ],
});
