import { describeRule } from '../describe-rule.ts';
import { eventOf, pourOf } from '../testing.ts';
import { letGoEarly } from './rule.ts';

const pours = [pourOf({ pouredAt: '2026-04-14T10:00' })];
const at = (letGoAt: string) => ({ letGoAt });
/** 50 °F: factor 1.5, so that 3 min become 4.5. */
const cold = [pourOf({ pouredAt: '2026-04-14T10:00', componentBTempF: 50 })];

describeRule(letGoEarly, {
  valid: [
    { name: 'as soon as it may be', line: { values: at('2026-04-14T10:03'), pours } },
    { name: 'no pours', line: { values: at('2026-04-14T10:00') } },
    { name: 'unreadable', line: { pours, broken: ['letGoAt'] } },
    {
      name: 'a later top-up leaves the first letting go in the right',
      line: {
        values: at('2026-04-14T12:00'),
        pours: [...pours, pourOf({ pouredAt: '2026-04-20T09:00', event: 2 })],
        events: [eventOf('set', 2, { letGoAt: '2026-04-20T11:00' })],
      },
    },
  ],
  invalid: [
    {
      name: 'a minute early',
      line: { values: at('2026-04-14T10:02'), pours },
      expected: [{ field: 'letGoAt', measured: 2, limit: 3, margin: -1, unit: 'min' }],
    },
    {
      name: 'cold components need half as long again',
      line: { values: at('2026-04-14T10:03'), pours: cold },
      expected: [
        { measured: 3, limit: 4.5, margin: -1.5, params: { factor: 1.5, coldestF: 50, baseMin: 3 } },
      ],
    },
    {
      name: 'the second event by its own clock',
      line: {
        values: at('2026-04-14T12:00'),
        pours: [...pours, pourOf({ pouredAt: '2026-04-20T09:00', event: 2 })],
        events: [eventOf('set', 2, { letGoAt: '2026-04-20T09:01' })],
      },
      expected: [{ part: 'event 2', measured: 1, limit: 3, margin: -2 }],
    },
    { name: 'blank', line: { pours }, expected: [{ unproved: 'letGoAt' }] },
  ],
});
