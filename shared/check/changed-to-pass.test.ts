import { describe, expect, it } from 'vitest';
import type { FieldValues } from '#shared/records/types.ts';
import type { EarlierFailure } from '#shared/rules/types.ts';
import { checkBatch } from './check-batch.ts';
import { DEMO_CONTEXT } from './demo-context.ts';
import { batchOf, CLEAN_LINES, CLEAN_POURS } from './testing.ts';

const [big, small] = CLEAN_POURS.set as readonly [FieldValues, FieldValues];
const failure = (part: Partial<EarlierFailure>): EarlierFailure => ({
  code: 'embedment-short',
  field: 'embedmentFt',
  measured: 5.5,
  limit: 6,
  unit: 'ft',
  values: { ...CLEAN_LINES.set, embedmentFt: 5.5 },
  pours: [big, small],
  ...part,
});
const find = (
  earlier: readonly EarlierFailure[],
  { values = {}, pours = [big, small] }: { values?: FieldValues; pours?: readonly FieldValues[] } = {},
) =>
  checkBatch(batchOf({ lines: [{ kind: 'set', values: { ...CLEAN_LINES.set, ...values } }], pours }), {
    ...DEMO_CONTEXT,
    previous: new Map([['set|S-1|1', earlier]]),
  }).findings;
const codes = (...args: Parameters<typeof find>) => find(...args).map(({ code }) => code);

describe('changed-to-pass', () => {
  it('names the value that was changed, with both values and the rule', () => {
    expect(find([failure({})])).toMatchObject([
      {
        code: 'changed-to-pass',
        severity: 'query',
        field: 'embedmentFt',
        measured: 6,
        limit: null,
        params: { rule: 'embedment-short', before: 5.5, earlierMeasured: 5.5, earlierLimit: 6 },
      },
    ]);
  });

  it('says nothing while the rule still fails', () => {
    expect(codes([failure({})], { values: { embedmentFt: 5.7, boreDepthFt: 5.7 } })).toEqual([
      'embedment-short',
    ]);
  });

  it.each([
    ['nothing was changed', failure({ values: CLEAN_LINES.set })],
    ['what was blank was filled in', failure({ values: { ...CLEAN_LINES.set, embedmentFt: null } })],
    ['a name was changed', failure({ values: { ...CLEAN_LINES.set, locateTicket: 'T-0' } })],
    ['the rule rests on no measured value', failure({ code: 'lot-held' })],
    ['the rule is not of this program', failure({ code: 'tomorrow' })],
    ['a rule on the batch', failure({ code: 'position-shared' })],
    ['only the order of pours differs', failure({ values: CLEAN_LINES.set, pours: [small, big] })],
  ])('says nothing where %s', (_name, earlier) => {
    expect(codes([earlier])).toEqual([]);
  });

  it('tells a rule once, by the field of the finding where that was changed', () => {
    const both = { ...CLEAN_LINES.set, embedmentFt: 5.5, boreTopIn: 19 };
    expect(find([failure({ values: both }), failure({ values: both, measured: 5.4 })])).toMatchObject([
      { field: 'embedmentFt', params: { changed: 2 } },
    ]);
    const other = { ...CLEAN_LINES.set, boreTopIn: 19 };
    expect(find([failure({ values: other })])).toMatchObject([
      { field: 'boreTopIn', params: { before: 19 } },
    ]);
  });

  it('sees kits that were changed or added, where they stand', () => {
    const short = failure({ code: 'fill-short', field: 'boreDepthFt', values: CLEAN_LINES.set });
    expect(find([{ ...short, pours: [{ ...big, kitFt3: 6 }, small] }])).toMatchObject([
      { code: 'changed-to-pass', sheet: 'Pours', field: 'kitFt3', measured: 8, params: { before: 6 } },
    ]);
    expect(find([{ ...short, pours: [big] }])).toMatchObject([
      { sheet: 'Pours', field: 'quantity', measured: 1, params: { before: 0 } },
    ]);
  });

  it('takes the top-up of a later event for what it is', () => {
    const short = failure({ code: 'fill-short', values: CLEAN_LINES.set, pours: [big] });
    const topUp = { ...small, event: 2, pouredAt: '2026-04-20T09:00' };
    expect(codes([short], { pours: [big, topUp] })).not.toContain('changed-to-pass');
  });

  it('is not undone by leaving the value out', () => {
    const early = failure({
      code: 'hardware-early',
      field: 'hardwareAt',
      values: { ...CLEAN_LINES.set, hardwareAt: '2026-04-14T10:09' },
    });
    expect(codes([early], { values: { hardwareAt: null } })).toEqual(['changed-to-pass', 'unproved']);
    expect(codes([early], { values: { hardwareAt: 'not-by-us' } })).toEqual(['changed-to-pass']);
  });
});
