import { expect, it } from 'vitest';
import type { LotDetail } from '#shared/generated/api-types.ts';
import { effectsOf } from './lot-effects.ts';

const use = (structureNumber: string, state: LotDetail['uses'][number]['state'], contractor: string) => ({
  recordId: structureNumber,
  structureNumber,
  kind: 'set' as const,
  state,
  workDay: '2026-04-07',
  batch: { id: 'b', number: '17-01' },
  contractor: { id: contractor, name: contractor },
  usedFt3: 8,
});
const LOT: LotDetail = {
  id: 'l',
  number: 'LK-2204',
  product: { id: 'p', code: 'EP-15' },
  expiresOn: null,
  status: 'in-use',
  receivedFt3: 100,
  usedFt3: 24,
  balanceFt3: 76,
  structures: 3,
  version: 1,
  can: ['receive', 'hold', 'recall'],
  events: [],
  uses: [
    use('17-0401', 'on-record', 'Tamsett'),
    use('17-0402', 'on-record', 'Brindle'),
    use('17-0403', 'undecided', 'Brindle'),
  ],
};

it('a recall says whom it reaches and that it is final', () => {
  expect(effectsOf(LOT, 'recalled')).toEqual([
    '3 structures have foam of it: 2 on record, 1 undecided.',
    'Brindle and Tamsett are told by e-mail, each of their own structures only.',
    'No decision changes by itself: what is submitted, approved or on record is not checked again, and is listed on this page.',
    'Every check from now on finds each pour of it, whenever it was poured.',
    'A recall is final. Nothing more can be received of the lot, and it cannot be released.',
  ]);
});

it('a hold of a lot that nobody used tells nobody', () => {
  expect(effectsOf({ ...LOT, uses: [] }, 'held')).toEqual([
    'No structure has foam of this lot so far.',
    'No decision changes by itself: what is submitted, approved or on record is not checked again, and is listed on this page.',
    'Every check from now on finds what is poured of it while it is held; what was poured before stands.',
    'A hold ends when the lot is released or recalled.',
  ]);
});

it('a release tells nobody', () => {
  expect(effectsOf(LOT, 'released')[1]).toBe('The lot is in use again. Nobody is told by e-mail.');
});
