import { describeRule } from '../describe-rule.ts';
import { pourOf } from '../testing.ts';
import type { LotFact } from '../types.ts';
import { lotHeld } from './rule.ts';

const lot = (fact: Partial<LotFact>) => ({
  lots: [{ product: 'EP-15', number: 'L-100', expiresOn: null, status: 'in-use' as const, ...fact }],
});
const HELD = { on: '2026-04-10', status: 'held' as const };
const FREED = { on: '2026-04-13', status: 'in-use' as const };

// Work day 2026-04-14.
describeRule(lotHeld, {
  valid: [
    { name: 'in use', line: { pours: [pourOf()] }, context: lot({ history: [] }) },
    {
      name: 'released the day before',
      line: { pours: [pourOf()] },
      context: lot({ history: [HELD, FREED] }),
    },
    {
      name: 'held since: it was in use on the work day',
      line: { pours: [pourOf()] },
      context: lot({ status: 'held', history: [{ on: '2026-04-15', status: 'held' }] }),
    },
    {
      name: 'held from the day after: a first pour counts on the work day, though it ended past midnight',
      line: { pours: [pourOf({ pouredAt: '2026-04-15T00:30' })] },
      context: lot({ status: 'held', history: [{ on: '2026-04-15', status: 'held' }] }),
    },
    { name: 'another lot', line: { pours: [pourOf({ lot: 'L-9' })] }, context: lot({ status: 'held' }) },
    { name: 'lots not known here', line: { pours: [pourOf()] } },
  ],
  invalid: [
    {
      name: 'held on the work day, released since',
      line: { pours: [pourOf()] },
      context: lot({ history: [HELD, { on: '2026-04-15', status: 'in-use' }] }),
      expected: [
        { measured: 'held', limit: 'in-use', margin: null, params: { since: '2026-04-10', later: false } },
      ],
    },
    {
      name: 'held that very day',
      line: { pours: [pourOf()] },
      context: lot({ status: 'held', history: [{ on: '2026-04-14', status: 'held' }] }),
      expected: [{ measured: 'held' }],
    },
    {
      name: 'recalled since',
      line: { pours: [pourOf()] },
      context: lot({ status: 'recalled', history: [{ on: '2026-06-01', status: 'recalled' }] }),
      expected: [{ measured: 'recalled', params: { since: '2026-06-01', later: true } }],
    },
    {
      name: 'held, since when is not known',
      line: { pours: [pourOf()] },
      context: lot({ status: 'held' }),
      expected: [{ measured: 'held', params: { since: null } }],
    },
    {
      name: 'a top-up of the days of the hold, by its own day',
      line: { pours: [pourOf({ event: 2, pouredAt: '2026-04-20T09:00' })] },
      context: lot({
        history: [
          { on: '2026-04-18', status: 'held' },
          { on: '2026-04-25', status: 'in-use' },
        ],
      }),
      expected: [{ measured: 'held' }],
    },
  ],
});
