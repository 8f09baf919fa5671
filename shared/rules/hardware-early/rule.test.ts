import { describeRule } from '../describe-rule.ts';
import { eventOf, pourOf } from '../testing.ts';
import { hardwareEarly } from './rule.ts';

const pours = [pourOf({ pouredAt: '2026-04-14T10:00' })];
const at = (hardwareAt: string) => ({ hardwareAt });
/** 50 °F: factor 1.5, so that 15 min become 22.5. */
const cold = [pourOf({ pouredAt: '2026-04-14T10:00', componentATempF: 50 })];

describeRule(hardwareEarly, {
  valid: [
    { name: 'after 15 min', line: { values: at('2026-04-14T10:15'), pours } },
    { name: 'not by us', line: { values: at('not-by-us'), pours } },
    { name: 'not yet', line: { values: at('not-yet'), pours } },
    { name: 'cold, after 23 min', line: { values: at('2026-04-14T10:23'), pours: cold } },
    { name: 'no pours', line: { values: at('2026-04-14T10:05') } },
    {
      name: 'pour without a time',
      line: { values: at('2026-04-14T10:05'), pours: [pourOf({ pouredAt: null })] },
    },
    {
      name: 'a later top-up leaves the first hardware in the right',
      line: {
        values: at('2026-04-14T10:20'),
        pours: [...pours, pourOf({ pouredAt: '2026-04-20T09:00', event: 2 })],
        events: [eventOf('set', 2, { beganAt: '2026-04-20T08:50', hardwareAt: '2026-04-20T09:30' })],
      },
    },
  ],
  invalid: [
    {
      name: 'after 9 min',
      line: { values: at('2026-04-14T10:09'), pours },
      expected: [{ field: 'hardwareAt', measured: 9, limit: 15, margin: -6, unit: 'min' }],
    },
    {
      name: 'cold, after 20 min',
      line: { values: at('2026-04-14T10:20'), pours: cold },
      expected: [
        { measured: 20, limit: 22.5, margin: -2.5, params: { factor: 1.5, coldestF: 50, baseMin: 15 } },
      ],
    },
    {
      name: 'before the pour',
      line: { values: at('2026-04-14T09:50'), pours },
      expected: [{ measured: -10, limit: 15, margin: -25 }],
    },
    {
      name: 'the last of two pours counts',
      line: {
        values: at('2026-04-14T10:20'),
        pours: [...pours, pourOf({ pourNumber: 2, pouredAt: '2026-04-14T10:08' })],
      },
      expected: [{ measured: 12, limit: 15, margin: -3 }],
    },
    {
      name: 'over the night the clocks went forward',
      // 2026-03-08 02:00 to 03:00 did not happen: 01:55 to 03:05 is 10 min.
      line: { values: at('2026-03-08T03:05'), pours: [pourOf({ pouredAt: '2026-03-08T01:55' })] },
      expected: [{ measured: 10, limit: 15, margin: -5 }],
    },
    {
      name: 'straighten: reattachment',
      line: { kind: 'straighten', values: { reattachedAt: '2026-04-14T10:05' }, pours },
      expected: [{ field: 'reattachedAt', measured: 5, limit: 15, margin: -10 }],
    },
    {
      name: 'the second event by its own clock',
      line: {
        values: at('2026-04-14T10:20'),
        pours: [...pours, pourOf({ pouredAt: '2026-04-20T09:00', event: 2 })],
        events: [eventOf('set', 2, { hardwareAt: '2026-04-20T09:04' })],
      },
      expected: [{ field: 'hardwareAt', part: 'event 2', measured: 4, limit: 15, margin: -11 }],
    },
    { name: 'blank', line: { pours }, expected: [{ unproved: 'hardwareAt' }] },
    {
      name: 'temperature not measured: too early in any case, and unproved',
      line: { values: at('2026-04-14T10:09'), pours: [pourOf({ componentATempF: null })] },
      expected: [{ measured: 9, limit: 15, margin: -6 }, { unproved: 'componentATempF' }],
    },
  ],
});
