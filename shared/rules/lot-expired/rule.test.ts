import { describeRule } from '../describe-rule.ts';
import { pourOf } from '../testing.ts';
import { lotExpired } from './rule.ts';

const lot = (expiresOn: string | null) => ({
  lots: [{ product: 'EP-15', number: 'L-100', expiresOn, status: 'in-use' as const }],
});

describeRule(lotExpired, {
  valid: [
    { name: 'poured on its last day', line: { pours: [pourOf()] }, context: lot('2026-04-14') },
    { name: 'no date', line: { pours: [pourOf()] }, context: lot(null) },
    {
      name: 'a lot that is not known',
      line: { pours: [pourOf({ lot: 'L-9' })] },
      context: lot('2020-01-01'),
    },
    { name: 'lot unreadable', line: { pours: [pourOf({ lot: null }, ['lot'])] }, context: lot('2020-01-01') },
    { name: 'lots not known here', line: { pours: [pourOf()] } },
  ],
  invalid: [
    {
      name: 'the day after',
      line: { pours: [pourOf()] },
      context: lot('2026-04-13'),
      expected: [{ measured: '2026-04-14', limit: '2026-04-13', margin: -1, unit: 'd' }],
    },
    {
      name: 'by the day of each pour',
      line: { pours: [pourOf(), pourOf({ event: 2, pouredAt: '2026-05-01T09:00' })] },
      context: lot('2026-04-20'),
      expected: [{ measured: '2026-05-01', limit: '2026-04-20', margin: -11 }],
    },
    {
      name: 'by the work day where the time of the pour is not known',
      line: { pours: [pourOf({ pouredAt: null })] },
      context: lot('2026-04-10'),
      expected: [{ measured: '2026-04-14', margin: -4 }],
    },
  ],
});
