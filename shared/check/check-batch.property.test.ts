import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { canonical } from '#shared/records/canonical.ts';
import { structureKey } from '#shared/records/structure-key.ts';
import { RECORD_FIELDS } from '#shared/records/field-meta.ts';
import {
  KINDS,
  SHEET_OF_KIND,
  type Kind,
  type Scalar,
  type SourceBatch,
  type SourceRow,
} from '#shared/records/types.ts';
import { renderFinding } from '#shared/findings/render.ts';
import type { CheckContext } from '#shared/rules/types.ts';
import { checkBatch } from './check-batch.ts';
import { DEMO_CONTEXT } from './demo-context.ts';
import { CLEAN_LINES, CLEAN_POURS, rowOf } from './testing.ts';
import type { CheckResult } from './types.ts';

const NUMBERS = ['S-1', 'S-2', 's-1 ', '', 'P-1'] as const;
const CLOCKS = [
  '2026-04-14T09:30',
  '2026-04-14T10:00',
  '2026-04-14T10:01',
  '2026-03-08T02:30',
  '2026-11-01T01:30',
  '2026-02-30T10:00',
  '2026-04-15T00:05',
] as const;
const WORDS = [
  'not-yet',
  'not-by-us',
  'not-measured',
  'soil',
  'rock',
  'crushed-stone',
  '4',
  'steel',
  'open',
] as const;

/** Anything a cell could come to: what is allowed, what is not, and what is absurd. */
const junk: fc.Arbitrary<Scalar> = fc.oneof(
  { weight: 4, arbitrary: fc.double({ min: -5, max: 60, noNaN: true }) },
  { weight: 2, arbitrary: fc.integer({ min: -2, max: 20 }) },
  { weight: 3, arbitrary: fc.constantFrom(...CLOCKS) },
  { weight: 2, arbitrary: fc.constantFrom(...WORDS, ...NUMBERS) },
  { weight: 1, arbitrary: fc.double() },
  { weight: 1, arbitrary: fc.string({ unit: 'binary', maxLength: 300 }) },
  { weight: 1, arbitrary: fc.boolean() },
  { weight: 1, arbitrary: fc.constant(null) },
);

/** Some of a record's fields changed to junk, the rest as in a clean one. */
const rowValues = (record: keyof typeof RECORD_FIELDS, clean: Readonly<Record<string, Scalar>>) =>
  fc
    .tuple(
      fc.constantFrom(...NUMBERS),
      fc.dictionary(fc.constantFrom(...RECORD_FIELDS[record].keys()), junk, { maxKeys: 6 }),
    )
    .map(([structureNumber, changes]) => ({ ...clean, structureNumber, ...changes }));

const line = fc
  .constantFrom(...KINDS)
  .chain((kind) => rowValues(kind, CLEAN_LINES[kind]).map((values) => ({ kind, values })));
const pour = fc.constantFrom(...KINDS).chain((kind) => rowValues('pour', CLEAN_POURS[kind][0] ?? {}));
const event = rowValues('event', { event: 2, beganAt: '2026-05-01T08:00' });
const photo = rowValues('photo', { fileName: 'a.jpg', view: 'kits' });

type Parts = {
  readonly lines: readonly { readonly kind: Kind; readonly values: Readonly<Record<string, Scalar>> }[];
  readonly pours: readonly Readonly<Record<string, Scalar>>[];
  readonly events: readonly Readonly<Record<string, Scalar>>[];
  readonly photos: readonly Readonly<Record<string, Scalar>>[];
};
const parts: fc.Arbitrary<Parts> = fc.record({
  lines: fc.array(line, { maxLength: 5 }),
  pours: fc.array(pour, { maxLength: 6 }),
  events: fc.array(event, { maxLength: 3 }),
  photos: fc.array(photo, { maxLength: 2 }),
});

const numbered = <T>(items: readonly T[], order: readonly number[]): readonly (readonly [T, number])[] =>
  items
    .map((item, index) => [item, order[index] ?? 0] as const)
    .toSorted(([, a], [, b]) => a - b)
    .map(([item], index) => [item, index + 4] as const);

/** The workbook with its rows in the order of some numbers. */
const build = ({ lines, pours, events, photos }: Parts, order: readonly number[]): SourceBatch => {
  const rows = (sheet: string, values: Parts['pours']): SourceRow[] =>
    numbered(values, order).map(([one, row]) => rowOf(sheet, row, one));
  return {
    batch: rowOf('Batch', 1, { workOrder: 'W-1', contractor: 'C', foreman: 'F', templateVersion: '2' }),
    lines: numbered(lines, order).map(([{ kind, values }, row]) => ({
      ...rowOf(SHEET_OF_KIND[kind], row, values),
      kind,
      structureNumber: String(values['structureNumber'] ?? ''),
    })),
    pours: rows('Pours', pours),
    events: rows('Events', events),
    photos: rows('Photos', photos),
    notices: [],
    templateVersion: '2',
  };
};

const CONTEXT: CheckContext = {
  ...DEMO_CONTEXT,
  asOfMs: Date.UTC(2026, 3, 14, 15),
  lots: [
    {
      product: 'EP-15',
      number: 'L-100',
      expiresOn: '2026-04-13',
      status: 'in-use',
      history: [{ on: '2026-04-01', status: 'held' }],
    },
  ],
  lotUse: [{ product: 'EP-15', number: 'L-100', sizes: [] }],
  design: [],
  neighbours: [{ structureNumber: 'X-1', latitude: 35.1, longitude: -97.4, accuracyFt: 5, own: false }],
  area: [
    [
      [
        [-98, 35],
        [-97, 35],
        [-97, 36],
      ],
    ],
  ],
  photos: new Map(
    NUMBERS.map((number) => [
      `set|${structureKey(number)}|1`,
      [
        {
          id: number,
          fileName: 'a.jpg',
          sha256: 'same',
          view: 'finish',
          facts: {
            takenWall: '2026-04-13T10:00:00',
            takenAtMs: null,
            latitude: 36,
            longitude: -97.4,
            width: 100,
            height: 100,
            phash: '00ff00ff00ff00ff',
          },
        },
      ],
    ]),
  ),
  otherPhotos: [],
  register: new Map([['S-2', { recordNumber: 'R-1', own: true }]]),
  previous: new Map([
    [
      'set|S-1|1',
      [
        {
          code: 'embedment-short',
          field: 'embedmentFt',
          measured: 5,
          limit: 6,
          unit: 'ft',
          values: { embedmentFt: 5 },
          pours: [],
        },
      ],
    ],
  ]),
  siblings: new Set(['set|S-2']),
};

const orders = fc.array(fc.integer(), { minLength: 6, maxLength: 6 });

/** A check without what moves with the rows. */
const withoutPlaces = (result: CheckResult): unknown => ({
  records: result.records
    .map(({ kind, structureNumber, occurrence, values, derived, workDay, ruleCodes }) =>
      canonical({ kind, structureNumber, occurrence, values, derived, workDay, ruleCodes }),
    )
    .toSorted(),
  findings: result.findings.map(({ row: _row, cell: _cell, ...finding }) => canonical(finding)).toSorted(),
  skipped: result.skipped,
});

// The runs take a second or three; a busy machine may need more than the runner's own limit.
describe('checkBatch on anything', { timeout: 60_000 }, () => {
  it('never throws, never says NaN, and puts every finding into words', () => {
    fc.assert(
      fc.property(parts, orders, (source, order) => {
        const result = checkBatch(build(source, order), CONTEXT);
        // JSON has no NaN or Infinity: what does not survive it is one.
        expect(JSON.parse(JSON.stringify(result.findings))).toEqual(result.findings);
        for (const record of result.records)
          for (const figure of Object.values(record.derived))
            expect(typeof figure !== 'number' || Number.isFinite(figure)).toBe(true);
        for (const finding of result.findings) {
          const { title, message, remedy } = renderFinding(finding);
          expect(title).not.toBe('Finding');
          expect(`${title}${message}${remedy}`).not.toMatch(/NaN|Infinity|undefined|\[object/);
        }
      }),
      { numRuns: 300 },
    );
  });

  it('gives every finding its own fingerprint', () => {
    fc.assert(
      fc.property(parts, orders, (source, order) => {
        const { findings } = checkBatch(build(source, order), CONTEXT);
        expect(new Set(findings.map(({ fingerprint }) => fingerprint)).size).toBe(findings.length);
      }),
      { numRuns: 200 },
    );
  });

  it('finds the same whatever the order of the rows, addresses apart', () => {
    fc.assert(
      fc.property(parts, orders, orders, (source, one, other) => {
        const first = withoutPlaces(checkBatch(build(source, one), CONTEXT));
        expect(withoutPlaces(checkBatch(build(source, other), CONTEXT))).toEqual(first);
      }),
      { numRuns: 200 },
    );
  });

  it('has margins that recompute from measured and limit, and fail', () => {
    fc.assert(
      fc.property(parts, orders, (source, order) => {
        const { findings } = checkBatch(build(source, order), CONTEXT);
        const wrong = findings.filter(({ measured, limit, margin }) => {
          if (margin === null) return false;
          if (margin >= 0) return true;
          const both = typeof measured === 'number' && typeof limit === 'number';
          return both && Math.abs(Math.abs(measured - limit) + margin) > 1e-9;
        });
        expect(wrong).toEqual([]);
      }),
      { numRuns: 200 },
    );
  });
});
