import { expect } from 'vitest';
import type { LotFact } from '#shared/rules/types.ts';
import { big, small, type Failing } from './failing-lines.ts';
import { CLEAN_LINES } from './testing.ts';

const LOT: LotFact = { product: 'EP-15', number: 'L-100', expiresOn: null, status: 'in-use', history: [] };
const OTHER: LotFact = { ...LOT, number: 'L-200' };

/** What is seen only with what the batch knows beside the line. */
export const FAILING_CONTEXT: readonly Failing[] = [
  { code: 'not-on-order', context: { design: [] }, expected: { measured: 'S-1', limit: null } },
  {
    code: 'done-twice',
    context: { siblings: new Set(['set|S-1']) },
    expected: { measured: 2, limit: 1, margin: -1 },
  },
  {
    code: 'unproved',
    values: { hardwareAt: null },
    expected: { measured: null, limit: null, field: 'hardwareAt' },
  },
  { code: 'photo-missing', values: { waterIn: 0.5 }, expected: { limit: 'water', field: 'waterIn' } },
  // The lot's last day is 2026-04-14.
  {
    code: 'lot-expired',
    context: { lots: [{ ...LOT, expiresOn: '2026-04-12' }, OTHER] },
    pours: [big, { ...small, lot: 'L-200' }],
    expected: { measured: '2026-04-14', limit: '2026-04-12', margin: -2, unit: 'd', sheet: 'Pours' },
  },
  {
    code: 'lot-held',
    context: {
      lots: [{ ...LOT, status: 'recalled', history: [{ on: '2026-05-02', status: 'recalled' }] }, OTHER],
    },
    pours: [big, { ...small, lot: 'L-200' }],
    expected: { measured: 'recalled', limit: 'in-use', params: { since: '2026-05-02', later: true } },
  },
  // Ten received, four used elsewhere, one of them by this contractor; seven more here.
  {
    code: 'lot-overdrawn',
    expected: {
      measured: 8,
      limit: null,
      kind: null,
      sheet: 'Batch',
      params: { product: 'EP-15', lot: 'L-100', kitFt3: 1.5 },
      ownerParams: { used: 11, received: 10, over: 1 },
    },
    pours: [{ ...big, kitFt3: 1.5, quantity: 7 }],
  },
  // 0.001° of latitude at 35.1° north are 110.94242 m (GeographicLib), 363.98430 ft, less 10.
  {
    code: 'position-off',
    values: { latitude: 35.101, accuracyFt: 10 },
    context: { photos: null },
    expected: { measured: expect.closeTo(353.9843, 3), limit: 15, margin: expect.closeTo(-338.9843, 3) },
  },
  {
    code: 'position-shared',
    context: {
      neighbours: [{ structureNumber: 'X-9', latitude: 35.1, longitude: -97.4, accuracyFt: 5, own: false }],
    },
    expected: { measured: 0, limit: 3, margin: -3, structureNumber: 'S-1', ownerParams: { other: 'X-9' } },
  },
  {
    code: 'position-outside',
    context: {
      area: [
        [
          [
            [0, 0],
            [1, 0],
            [0, 1],
          ],
        ],
      ],
    },
    expected: { measured: '35.1, -97.4', limit: null, field: 'latitude' },
  },
  {
    code: 'already-on-record',
    context: { register: new Map([['S-1', { recordNumber: 'R-000007', own: false }]]) },
    expected: { measured: 'S-1', limit: null, params: {}, ownerParams: { recordNumber: 'R-000007' } },
  },
  {
    code: 'changed-to-pass',
    context: {
      previous: new Map([
        [
          'set|S-1|1',
          [
            {
              code: 'embedment-short',
              field: 'embedmentFt',
              measured: 5.5,
              limit: 6,
              unit: 'ft',
              values: { ...CLEAN_LINES.set, embedmentFt: 5.5 },
              pours: [big, small],
            },
          ],
        ],
      ]),
    },
    expected: { measured: 6, field: 'embedmentFt', params: { rule: 'embedment-short', before: 5.5 } },
  },
  {
    code: 'design-differs',
    values: { poleClass: '3' },
    expected: { measured: '3', limit: '4', margin: null, field: 'poleClass' },
  },
];
