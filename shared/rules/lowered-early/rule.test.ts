import { describeRule } from '../describe-rule.ts';
import { eventOf, pourOf } from '../testing.ts';
import { loweredEarly } from './rule.ts';

const pours = [pourOf({ pouredAt: '2026-04-14T10:00' })];
const at = (loweredAt: string) => ({ loweredAt });
/** 50 °F: factor 1.5, so that 5 min become 7.5. */
const cold = [pourOf({ pouredAt: '2026-04-14T10:00', componentBTempF: 50 })];

describeRule(loweredEarly, {
  valid: [
    { name: 'as soon as it may be', line: { kind: 'relevel', values: at('2026-04-14T10:05'), pours } },
    { name: 'no pours', line: { kind: 'relevel', values: at('2026-04-14T10:00') } },
    { name: 'unreadable', line: { kind: 'relevel', pours, broken: ['loweredAt'] } },
    {
      name: 'a later top-up leaves the first lowering in the right',
      line: {
        kind: 'relevel',
        values: at('2026-04-14T12:00'),
        pours: [...pours, pourOf({ pouredAt: '2026-04-20T09:00', event: 2 })],
        events: [eventOf('relevel', 2, { loweredAt: '2026-04-20T11:00' })],
      },
    },
  ],
  invalid: [
    {
      name: 'a minute early',
      line: { kind: 'relevel', values: at('2026-04-14T10:04'), pours },
      expected: [{ field: 'loweredAt', measured: 4, limit: 5, margin: -1, unit: 'min' }],
    },
    {
      name: 'cold components need half as long again',
      line: { kind: 'relevel', values: at('2026-04-14T10:05'), pours: cold },
      expected: [
        { measured: 5, limit: 7.5, margin: -2.5, params: { factor: 1.5, coldestF: 50, baseMin: 5 } },
      ],
    },
    {
      name: 'the second event by its own clock',
      line: {
        kind: 'relevel',
        values: at('2026-04-14T12:00'),
        pours: [...pours, pourOf({ pouredAt: '2026-04-20T09:00', event: 2 })],
        events: [eventOf('relevel', 2, { loweredAt: '2026-04-20T09:01' })],
      },
      expected: [{ part: 'event 2', measured: 1, limit: 5, margin: -4 }],
    },
    { name: 'blank', line: { kind: 'relevel', pours }, expected: [{ unproved: 'loweredAt' }] },
  ],
});
