import { describe, expect, it } from 'vitest';
import { checkBatch } from '#shared/check/check-batch.ts';
import { DEMO_CONTEXT } from '#shared/check/demo-context.ts';
import { batchOf, CLEAN_LINES, CLEAN_POURS } from '#shared/check/testing.ts';
import type { FieldValues } from '#shared/records/types.ts';
import { compareChecks } from './compare.ts';

const check = (values: FieldValues, pours: readonly FieldValues[] = CLEAN_POURS.set) =>
  checkBatch(
    batchOf({ lines: [{ kind: 'set', values: { ...CLEAN_LINES.set, ...values } }], pours }),
    DEMO_CONTEXT,
  );
const codes = (findings: readonly { readonly code: string }[]) => findings.map(({ code }) => code);

describe('compareChecks', () => {
  it('is empty between two checks of one workbook', () => {
    expect(compareChecks(check({}), check({}))).toEqual({
      values: [],
      findings: { gone: [], fresh: [], changed: [] },
    });
  });

  it('tells values, and findings gone, new and changed', () => {
    const before = check({ embedmentFt: 5.5, boreDepthFt: 5.5, leastGapIn: 1 });
    const after = check({ embedmentFt: 6, boreDepthFt: 6, leastGapIn: 1.5, hardwareAt: null });
    const { values, findings } = compareChecks(before, after);
    expect(values.map(({ field, before, after }) => [field, before, after])).toEqual([
      ['boreDepthFt', 5.5, 6],
      ['leastGapIn', 1, 1.5],
      ['embedmentFt', 5.5, 6],
      ['hardwareAt', '2026-04-14T10:40', null],
    ]);
    expect(codes(findings.gone)).toEqual(['embedment-short']);
    expect(codes(findings.fresh)).toEqual(['unproved']);
    expect(findings.changed.map((one) => [one.before.measured, one.after.measured])).toEqual([[1, 1.5]]);
  });

  it("tells a pour's value by its pour and row, with its cell", () => {
    const changed = [CLEAN_POURS.set[0]!, { ...CLEAN_POURS.set[1]!, quantity: 2 }];
    expect(compareChecks(check({}), check({}, changed)).values).toMatchObject([
      { field: 'quantity', part: 'pour 1, row 1', before: 1, after: 2, sheet: 'Pours' },
    ]);
  });

  it('tells lines that came and went by their structure number', () => {
    const { values } = compareChecks(check({}), check({ structureNumber: 'S-5' }));
    expect(values).toMatchObject([
      { structureNumber: 'S-1', field: 'structureNumber', before: 'S-1', after: null },
      { structureNumber: 'S-5', field: 'structureNumber', before: null, after: 'S-5' },
    ]);
  });
});
