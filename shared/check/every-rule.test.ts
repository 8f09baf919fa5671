import { describe, expect, it } from 'vitest';
import type { FieldValues } from '#shared/records/types.ts';
import { RULES } from '#shared/rules/registry.ts';
import type { CheckContext, PhotoFact } from '#shared/rules/types.ts';
import { checkBatch } from './check-batch.ts';
import { DEMO_CONTEXT } from './demo-context.ts';
import { batchOf, CLEAN_LINES, CLEAN_POURS } from './testing.ts';

/** Every rule once failing through the whole check, alone; the clean line is its passing side. Limits: the demo standard. */

const [big, small] = CLEAN_POURS.set as readonly [FieldValues, FieldValues];
const photo = (view: string): PhotoFact => ({ id: view, fileName: `${view}.jpg`, sha256: view, view });
const CONTEXT: CheckContext = {
  ...DEMO_CONTEXT,
  lots: [{ product: 'EP-15', number: 'L-100', expiresOn: null, status: 'in-use' }],
  design: [
    {
      structureNumber: 'S-1',
      kind: 'set',
      poleLengthFt: 40,
      poleClass: '4',
      poleMaterial: 'southern-pine',
      embedmentFt: null,
      latitude: null,
      longitude: null,
    },
  ],
  photos: new Map([['set|S-1|1', ['bore-depth', 'kits', 'finish', 'plumb'].map(photo)]]),
  siblings: new Set(),
};

type Failing = {
  readonly code: string;
  readonly values?: FieldValues;
  readonly pours?: readonly FieldValues[];
  readonly context?: Partial<CheckContext>;
  readonly expected: Readonly<Record<string, unknown>>;
};

const FAILING: readonly Failing[] = [
  {
    code: 'embedment-short',
    values: { embedmentFt: 5.75, boreDepthFt: 5.75 },
    expected: { measured: 5.75, limit: 6, margin: -0.25, unit: 'ft', field: 'embedmentFt' },
  },
  {
    code: 'embedment-deep',
    values: { embedmentFt: 8, boreDepthFt: 8 },
    pours: [{ ...big, quantity: 2 }],
    expected: { measured: 8, limit: 7.5, margin: -0.5 },
  },
  {
    code: 'bore-shallow',
    values: { boreDepthFt: 5.75 },
    expected: { measured: 5.75, limit: 5.9, margin: expect.closeTo(-0.15, 9), field: 'boreDepthFt' },
  },
  {
    code: 'annulus-narrow',
    values: { leastGapIn: 1.5 },
    expected: { measured: 1.5, limit: 2, margin: -0.5, field: 'leastGapIn' },
  },
  // WR-01: void 8.6701 ft³.
  {
    code: 'fill-short',
    pours: [big],
    expected: {
      measured: expect.closeTo(8 / 8.6701, 4),
      limit: 1,
      margin: expect.closeTo(8 / 8.6701 - 1, 4),
      unit: 'ratio',
    },
  },
  {
    code: 'fill-excess',
    pours: [{ ...big, quantity: 2 }],
    expected: {
      measured: expect.closeTo(16 / 8.6701, 4),
      limit: 1.5,
      margin: expect.closeTo(1.5 - 16 / 8.6701, 4),
    },
  },
  // WR-09: foam 6 in below grade, 8.5 ft³ in 7.9202 ft³.
  {
    code: 'crown-low',
    values: { foamTopBelowGradeIn: 6 },
    expected: { measured: 6, limit: 0, margin: -6, unit: 'in' },
  },
  // WR-08: 1.2 in of water in an open 18 in bore stands at 2.16 in round a 12 in butt.
  {
    code: 'water-deep',
    values: {
      waterIn: 1.2,
      boreTopIn: 18,
      girthGroundLineIn: null,
      girthButtIn: null,
      diameterGroundLineIn: 12,
      diameterButtIn: 12,
    },
    pours: [{ ...big, kitFt3: 6 }],
    context: { photos: null },
    expected: { measured: expect.closeTo(2.16, 3), limit: 2, margin: expect.closeTo(-0.16, 3), unit: 'in' },
  },
  {
    code: 'hardware-early',
    values: { letGoAt: null, hardwareAt: '2026-04-14T10:09' },
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
    values: { boredAt: '2026-03-08T02:30' },
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
];

const batch = ({ values = {}, pours = [big, small] }: Pick<Failing, 'values' | 'pours'>) =>
  batchOf({ lines: [{ kind: 'set', values: { ...CLEAN_LINES.set, ...values } }], pours });

describe('every rule through the check', () => {
  it('passes on the clean line with all of the context known', () => {
    expect(checkBatch(batch({}), CONTEXT)).toMatchObject({ findings: [], skipped: [] });
  });

  it('has a failing line here', () => {
    expect(FAILING.map(({ code }) => code)).toEqual(RULES.map(({ code }) => code));
  });

  it.each(FAILING)('$code fails alone', ({ code, context, expected, ...parts }) => {
    const { findings, records } = checkBatch(batch(parts), { ...CONTEXT, ...context });
    expect(findings.map((finding) => finding.code)).toEqual([code]);
    expect(findings[0]).toMatchObject(expected);
    expect(records[0]?.ruleCodes).toEqual(code === 'pour-orphan' ? [] : [code]);
  });
});
