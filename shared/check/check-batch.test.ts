import { describe, expect, it } from 'vitest';
import type { FieldValues } from '#shared/records/types.ts';
import type { CheckContext } from '#shared/rules/types.ts';
import { DEMO_STANDARD } from '#shared/standard/demo.ts';
import { checkBatch } from './check-batch.ts';
import { DEMO_CONTEXT } from './demo-context.ts';
import { batchOf, CLEAN_LINES, CLEAN_POURS, cleanBatch } from './testing.ts';

const set = CLEAN_LINES.set;
const pours = CLEAN_POURS.set;
const codes = (source: Parameters<typeof checkBatch>[0], context: CheckContext = DEMO_CONTEXT) =>
  checkBatch(source, context).findings.map(({ code }) => code);
const setBatch = (values: FieldValues, more: readonly FieldValues[] = pours) =>
  batchOf({ lines: [{ kind: 'set', values: { ...set, ...values } }], pours: more });

describe('a clean batch of the three kinds', () => {
  const result = checkBatch(cleanBatch({ set: {}, straighten: {}, relevel: {} }), DEMO_CONTEXT);

  it('has no findings', () => {
    expect(result.findings).toEqual([]);
  });

  it('has a record a line with its figures, standard, product and work day', () => {
    expect(result.records.map(({ kind }) => kind)).toEqual(['set', 'straighten', 'relevel']);
    // Worked record WR-01, voids by numeric integration.
    const { derived, ...record } = result.records[0]!;
    expect(record).toMatchObject({
      workDay: '2026-04-14',
      standardId: 'demo',
      product: { code: 'EP-15', n: 1 },
      ruleCodes: [],
    });
    expect(derived.voidFt3).toBeCloseTo(8.6701, 3);
    expect(derived.fillRatio).toBeCloseTo(1.0957, 3);
    expect(derived.fillRatioU).toBeCloseTo(0.1085, 3);
  });

  it('says what did not run', () => {
    expect(result.skipped).toEqual([
      { code: 'brand-differs', reason: 'off' },
      { code: 'clock-future', reason: 'no-time' },
      { code: 'lot-unknown', reason: 'no-lots' },
      { code: 'lot-expired', reason: 'no-lots' },
      { code: 'lot-held', reason: 'no-lots' },
      { code: 'lot-overdrawn', reason: 'no-lot-use' },
      { code: 'position-off', reason: 'no-design' },
      { code: 'position-shared', reason: 'no-register' },
      { code: 'position-outside', reason: 'no-area' },
      { code: 'not-on-order', reason: 'no-design' },
      { code: 'already-on-record', reason: 'no-register' },
      { code: 'design-differs', reason: 'no-design' },
      { code: 'changed-to-pass', reason: 'no-earlier-check' },
      { code: 'photo-missing', reason: 'no-photos' },
      { code: 'photo-reused', reason: 'no-photos' },
      { code: 'photo-alike', reason: 'no-photos' },
      { code: 'photo-elsewhen', reason: 'no-photos' },
      { code: 'photo-elsewhere', reason: 'no-photos' },
      { code: 'photo-undated', reason: 'no-photos' },
      { code: 'photo-small', reason: 'no-photos' },
    ]);
  });
});

describe('records', () => {
  it('a required blank is record-missing, and what hangs on it is silent', () => {
    const source = { ...setBatch({ boreDepthFt: null }), columns: { Set: { boreDepthFt: 'H' } } };
    const { findings } = checkBatch(source, DEMO_CONTEXT);
    expect(findings).toMatchObject([
      { code: 'record-missing', field: 'boreDepthFt', cell: 'H4', severity: 'nonconformity', measured: null },
    ]);
  });

  it('a blank optional reading with a finding leaves its figures unknown instead of at their default', () => {
    const { records, findings } = checkBatch(setBatch({ boreBottomIn: 3 }), DEMO_CONTEXT);
    expect(findings).toMatchObject([
      { code: 'record-range', field: 'boreBottomIn', measured: 3, limit: 4, margin: -1, unit: 'in' },
    ]);
    expect(records[0]?.derived).toMatchObject({
      voidFt3: null,
      fillRatio: null,
      leastAnnulusIn: null,
      dueFt: 6,
    });
  });

  it.each([
    ['record-code', { ground: 'mud' }, 'ground'],
    ['record-type', { boreTopIn: 'wide' }, 'boreTopIn'],
    ['record-unreadable', { setAt: '14 April' }, 'setAt'],
    ['record-conditional', { ground: 'soil-over-rock' }, 'rockFromFt'],
    ['record-conditional', { leanInPer10Ft: 0.5 }, 'leanAzimuthDeg'],
    ['record-conditional', { poleLengthFt: 130, girthButtIn: null }, 'girthButtIn'],
  ])('%s', (code, values, field) => {
    const { findings } = checkBatch(setBatch(values), DEMO_CONTEXT);
    expect(findings.filter((finding) => finding.code.startsWith('record-'))).toMatchObject([{ code, field }]);
  });

  it('a problem of the reader is told once, with the cell and what stood there', () => {
    const source = setBatch({ boreTopIn: null });
    const line = source.lines[0]!;
    const problem = {
      field: 'boreTopIn',
      address: 'G4',
      raw: '1.200,5',
      code: 'record-unreadable',
      params: { why: 'separators' },
    };
    const { findings } = checkBatch({ ...source, lines: [{ ...line, problems: [problem] }] }, DEMO_CONTEXT);
    expect(findings).toMatchObject([
      { code: 'record-unreadable', cell: 'G4', measured: '1.200,5', params: { why: 'separators' } },
    ]);
  });
});

describe('linking', () => {
  it('a pour of a structure on two sheets must say its kind; the lines are not told that they have none', () => {
    const relevel = { ...CLEAN_LINES.relevel, structureNumber: 'S-1' };
    const source = batchOf({
      lines: [
        { kind: 'set', values: set },
        { kind: 'relevel', values: relevel },
      ],
      pours: [
        ...pours,
        ...CLEAN_POURS.relevel.map((pour) => ({ ...pour, structureNumber: 'S-1', kind: 'relevel' })),
      ],
    });
    const found = checkBatch(source, DEMO_CONTEXT).findings;
    expect(found.map(({ code, field, kind }) => [code, field, kind])).toEqual([
      ['record-conditional', 'kind', null],
      ['record-conditional', 'kind', null],
    ]);
    expect(new Set(found.map(({ fingerprint }) => fingerprint)).size).toBe(2);
  });

  it('a structure that stands twice gets done-twice on the later line, and its foam counts once', () => {
    const source = batchOf({
      lines: [
        { kind: 'set', values: { ...set, setAt: '2026-04-14T09:50' } },
        { kind: 'set', values: set },
      ],
      pours,
    });
    const { findings, records } = checkBatch(source, DEMO_CONTEXT);
    expect(findings).toMatchObject([{ code: 'done-twice', occurrence: 2, row: 4, measured: 2, limit: 1 }]);
    expect(records.map(({ occurrence, pours }) => [occurrence, pours.length])).toEqual([
      [2, 0],
      [1, 2],
    ]);
  });

  it('an event without a line and a photograph without one', () => {
    const source = batchOf({
      lines: [{ kind: 'set', values: set }],
      pours,
      events: [{ structureNumber: 'S-9', event: 2, beganAt: '2026-05-01T08:00' }],
      photos: [{ fileName: 'a.jpg', structureNumber: 'S-9', view: 'kits' }],
    });
    expect(checkBatch(source, DEMO_CONTEXT).findings).toMatchObject([
      {
        code: 'record-orphan',
        sheet: 'Events',
        severity: 'nonconformity',
        structureNumber: 'S-9',
        kind: null,
      },
      { code: 'record-orphan', sheet: 'Photos', severity: 'note' },
    ]);
  });

  it('two rows for one event', () => {
    const event = { structureNumber: 'S-1', event: 2, beganAt: '2026-05-01T08:00' };
    const source = batchOf({ lines: [{ kind: 'set', values: set }], pours, events: [event, event] });
    expect(codes(source)).toEqual(['record-duplicate']);
  });

  it('a top-up by an event fills what the first pour left', () => {
    const topUp = { ...pours[1], event: 2, pouredAt: '2026-05-01T08:30', kitFt3: 1.5 };
    const event = {
      structureNumber: 'S-1',
      event: 2,
      beganAt: '2026-05-01T08:00',
      hardwareAt: 'not-by-us',
      letGoAt: 'not-by-us',
      loadAt: 'not-yet',
    };
    const lines = [{ kind: 'set' as const, values: set }];
    expect(codes(batchOf({ lines, pours: pours.slice(0, 1) }))).toEqual(['fill-short']);
    expect(codes(batchOf({ lines, pours: [pours[0]!, topUp], events: [event] }))).toEqual([]);
  });
});

describe('standard and context', () => {
  const stricter = {
    ...DEMO_STANDARD,
    rules: {
      ...DEMO_STANDARD.rules,
      'annulus-narrow': { on: true, severity: 'query' as const, params: { leastGapIn: 5 } },
    },
  };
  const context: CheckContext = {
    ...DEMO_CONTEXT,
    standards: [
      { id: 'a', n: 1, effectiveOn: '2026-01-01', body: DEMO_STANDARD },
      { id: 'b', n: 2, effectiveOn: '2026-04-15', body: stricter },
    ],
  };

  it('judges each line by the version in force on its work day', () => {
    const after = {
      boredAt: '2026-04-15T09:00',
      setAt: '2026-04-15T09:40',
      letGoAt: 'not-by-us',
      hardwareAt: 'not-yet',
    };
    const late = pours.map((pour) => ({ ...pour, pouredAt: '2026-04-15T10:00' }));
    expect(codes(setBatch({}), context)).toEqual([]);
    const { records, findings } = checkBatch(setBatch(after, late), context);
    expect(records[0]).toMatchObject({ standardId: 'b', standardNumber: 2 });
    // WR-01: least annulus 3.952 in.
    expect(findings).toMatchObject([{ code: 'annulus-narrow', severity: 'query', limit: 5 }]);
    expect(findings[0]?.margin).toBeCloseTo(-1.048, 2);
  });

  it('a rule that is off does not run and says so', () => {
    const off = {
      ...DEMO_STANDARD,
      rules: { ...DEMO_STANDARD.rules, 'fill-short': { ...DEMO_STANDARD.rules['fill-short'], on: false } },
    };
    const standards = [{ id: 'off', n: 1, effectiveOn: '2026-01-01', body: off }];
    const result = checkBatch(setBatch({}, pours.slice(1)), { ...DEMO_CONTEXT, standards });
    expect(result.findings.map(({ code }) => code)).toEqual([]);
    expect(result.skipped).toContainEqual({ code: 'fill-short', reason: 'off' });
  });

  it('without any standard nothing is judged, and that is said', () => {
    expect(codes(setBatch({}), { ...DEMO_CONTEXT, standards: [] })).toEqual(['standard-none']);
  });

  it('takes the design depth where the work order states a deeper one', () => {
    const design = [
      {
        structureNumber: 'S-1',
        kind: 'set' as const,
        poleLengthFt: 40,
        poleClass: '4',
        poleMaterial: 'southern-pine',
        embedmentFt: 6.5,
        latitude: null,
        longitude: null,
      },
    ];
    expect(checkBatch(setBatch({}), { ...DEMO_CONTEXT, design }).findings).toMatchObject([
      { code: 'embedment-short', measured: 6, limit: 6.5, margin: -0.5 },
    ]);
  });
});
