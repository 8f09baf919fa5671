import { describeRule } from '../describe-rule.ts';
import { eventOf, pourOf } from '../testing.ts';
import { releaseEarly } from './rule.ts';

const pours = [pourOf({ pouredAt: '2026-04-14T10:00' })];
const at = (releasedAt: string) => ({ releasedAt });
/** 50 °F: factor 1.5, so that 15 min become 22.5. */
const cold = [pourOf({ pouredAt: '2026-04-14T10:00', componentBTempF: 50 })];

describeRule(releaseEarly, {
  valid: [
    { name: 'as soon as it may be', line: { kind: 'straighten', values: at('2026-04-14T10:15'), pours } },
    { name: 'no pours', line: { kind: 'straighten', values: at('2026-04-14T10:00') } },
    { name: 'unreadable', line: { kind: 'straighten', pours, broken: ['releasedAt'] } },
    {
      name: 'a later top-up leaves the first release in the right',
      line: {
        kind: 'straighten',
        values: at('2026-04-14T12:00'),
        pours: [...pours, pourOf({ pouredAt: '2026-04-20T09:00', event: 2 })],
        events: [eventOf('straighten', 2, { releasedAt: '2026-04-20T11:00' })],
      },
    },
  ],
  invalid: [
    {
      name: 'a minute early',
      line: { kind: 'straighten', values: at('2026-04-14T10:14'), pours },
      expected: [{ field: 'releasedAt', measured: 14, limit: 15, margin: -1, unit: 'min' }],
    },
    {
      name: 'cold components need half as long again',
      line: { kind: 'straighten', values: at('2026-04-14T10:15'), pours: cold },
      expected: [
        { measured: 15, limit: 22.5, margin: -7.5, params: { factor: 1.5, coldestF: 50, baseMin: 15 } },
      ],
    },
    {
      name: 'the second event by its own clock',
      line: {
        kind: 'straighten',
        values: at('2026-04-14T12:00'),
        pours: [...pours, pourOf({ pouredAt: '2026-04-20T09:00', event: 2 })],
        events: [eventOf('straighten', 2, { releasedAt: '2026-04-20T09:01' })],
      },
      expected: [{ part: 'event 2', measured: 1, limit: 15, margin: -14 }],
    },
    { name: 'blank', line: { kind: 'straighten', pours }, expected: [{ unproved: 'releasedAt' }] },
  ],
});
