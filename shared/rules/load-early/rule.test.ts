import { describeRule } from '../describe-rule.ts';
import { eventOf, pourOf } from '../testing.ts';
import { loadEarly } from './rule.ts';

const pours = [pourOf({ pouredAt: '2026-04-14T10:00' })];
const at = (loadAt: string) => ({ loadAt });
/** 50 °F: factor 1.5, so that 60 min become 90. */
const cold = [pourOf({ pouredAt: '2026-04-14T10:00', componentBTempF: 50 })];

describeRule(loadEarly, {
  valid: [
    { name: 'as soon as it may be', line: { values: at('2026-04-14T11:00'), pours } },
    { name: 'no pours', line: { values: at('2026-04-14T10:00') } },
    { name: 'unreadable', line: { pours, broken: ['loadAt'] } },
    {
      name: 'a later top-up leaves the first line tension in the right',
      line: {
        values: at('2026-04-14T12:00'),
        pours: [...pours, pourOf({ pouredAt: '2026-04-20T09:00', event: 2 })],
        events: [eventOf('set', 2, { loadAt: '2026-04-20T11:00' })],
      },
    },
  ],
  invalid: [
    {
      name: 'a minute early',
      line: { values: at('2026-04-14T10:59'), pours },
      expected: [{ field: 'loadAt', measured: 59, limit: 60, margin: -1, unit: 'min' }],
    },
    {
      name: 'cold components need half as long again',
      line: { values: at('2026-04-14T11:00'), pours: cold },
      expected: [
        { measured: 60, limit: 90, margin: -30, params: { factor: 1.5, coldestF: 50, baseMin: 60 } },
      ],
    },
    {
      name: 'the second event by its own clock',
      line: {
        values: at('2026-04-14T12:00'),
        pours: [...pours, pourOf({ pouredAt: '2026-04-20T09:00', event: 2 })],
        events: [eventOf('set', 2, { loadAt: '2026-04-20T09:01' })],
      },
      expected: [{ part: 'event 2', measured: 1, limit: 60, margin: -59 }],
    },
    { name: 'blank', line: { pours }, expected: [{ unproved: 'loadAt' }] },
  ],
});
