import { DEMO_PRODUCT } from '#shared/standard/demo.ts';
import { DEMO_CONTEXT } from './demo-context.ts';
import { big, small, type Failing } from './failing-lines.ts';

/** Times, pours and lots. */
export const FAILING_TIMES: readonly Failing[] = [
  {
    code: 'hardware-early',
    values: { hardwareAt: '2026-04-14T10:09' },
    expected: { measured: 9, limit: 15, margin: -6, unit: 'min' },
  },
  {
    code: 'lift-early',
    pours: [big, { ...small, pourNumber: 2, pouredAt: '2026-04-14T10:01' }],
    expected: { measured: 1, limit: 3, margin: -2, sheet: 'Pours', field: 'pouredAt' },
  },
  {
    code: 'clock-order',
    values: { setAt: '2026-04-14T08:45' },
    expected: { measured: '2026-04-14T08:45', limit: '2026-04-14T09:00', margin: -15 },
  },
  {
    code: 'clock-unreal',
    values: { boredAt: '2026-03-08T02:30', locateFrom: '2026-03-01' },
    expected: { measured: '2026-03-08T02:30', limit: null, margin: null },
  },
  { code: 'pour-none', pours: [], expected: { measured: 0, limit: 1, margin: -1 } },
  {
    code: 'pour-orphan',
    pours: [big, small, { ...small, structureNumber: 'S-9' }],
    expected: { measured: 'S-9', kind: null, structureNumber: 'S-9', sheet: 'Pours' },
  },
  // 5 and 4 ft³ fill the void as well as 8 and 1.5.
  {
    code: 'kit-unknown',
    pours: [
      { ...big, kitFt3: 5 },
      { ...small, kitFt3: 4 },
    ],
    expected: { measured: 5, limit: '1.5, 2.5, 4, 6, 8' },
  },
  { code: 'lot-unknown', pours: [{ ...big, lot: 'L-9' }, small], expected: { measured: 'L-9', limit: null } },
  {
    code: 'let-go-early',
    values: { letGoAt: '2026-04-14T10:02' },
    expected: { measured: 2, limit: 3, margin: -1, unit: 'min' },
  },
  {
    code: 'load-early',
    values: { loadAt: '2026-04-14T10:59' },
    expected: { measured: 59, limit: 60, margin: -1, unit: 'min' },
  },
  {
    code: 'release-early',
    kind: 'straighten',
    values: { releasedAt: '2026-04-14T11:34' },
    expected: { measured: 14, limit: 15, margin: -1, field: 'releasedAt' },
  },
  {
    code: 'lowered-early',
    kind: 'relevel',
    values: { loweredAt: '2026-04-14T13:14' },
    expected: { measured: 4, limit: 5, margin: -1, field: 'loweredAt' },
  },
  // Handed in at noon of 2026-04-14 in Chicago.
  {
    code: 'clock-future',
    values: { loadAt: '2026-04-14T12:30' },
    context: { asOfMs: Date.UTC(2026, 3, 14, 17) },
    expected: { measured: '2026-04-14T12:30', limit: '2026-04-14T12:00', margin: -30 },
  },
  // 38 °F foams at the least factor, 0.80: 0.8 × (8 + 4) = 9.6 ft³; waits at their most, doubled.
  {
    code: 'foam-cold',
    values: { letGoAt: '2026-04-14T10:06' },
    pours: [
      { ...big, componentATempF: 38 },
      { ...small, kitFt3: 4 },
    ],
    expected: { measured: 38, limit: 40, margin: -2, unit: 'degF', sheet: 'Pours', field: 'componentATempF' },
  },
  {
    code: 'foam-hot',
    pours: [{ ...big, componentBTempF: 104 }, small],
    expected: { measured: 104, limit: 100, margin: -4, unit: 'degF', field: 'componentBTempF' },
  },
  {
    code: 'product-mixed',
    pours: [big, { ...small, product: 'EP-20' }],
    context: {
      products: [
        ...DEMO_CONTEXT.products,
        { code: 'EP-20', n: 1, effectiveOn: '1900-01-01', body: { ...DEMO_PRODUCT, code: 'EP-20' } },
      ],
      lots: null,
    },
    expected: { measured: 2, limit: 1, margin: -1 },
  },
  {
    code: 'locate-missing',
    values: { locateTicket: null },
    expected: { measured: null, limit: null, field: 'locateTicket' },
  },
  {
    code: 'locate-lapsed',
    values: { locateTo: '2026-04-12' },
    expected: { measured: '2026-04-14', limit: '2026-04-12', margin: -2, unit: 'd' },
  },
];
