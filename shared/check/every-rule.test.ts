import { describe, expect, it } from 'vitest';
import { KINDS } from '#shared/records/types.ts';
import { RULES } from '#shared/rules/registry.ts';
import { checkBatch } from './check-batch.ts';
import { FAILING_CONTEXT } from './failing-context.ts';
import type { Failing } from './failing-lines.ts';
import { FAILING_MEASURES } from './failing-measures.ts';
import { FAILING_PHOTOS } from './failing-photos.ts';
import { FAILING_TIMES } from './failing-times.ts';
import { FULL_CONTEXT } from './full-context.ts';
import { batchOf, CLEAN_LINES, CLEAN_POURS } from './testing.ts';

/** Every rule once failing through the whole check, alone; the clean line is its passing side. Limits: the demo standard. */

const FAILING = [...FAILING_MEASURES, ...FAILING_TIMES, ...FAILING_CONTEXT, ...FAILING_PHOTOS];
const batch = ({ kind = 'set', values = {}, pours = CLEAN_POURS[kind] }: Partial<Failing>) =>
  batchOf({ lines: [{ kind, values: { ...CLEAN_LINES[kind], ...values } }], pours });

describe('every rule through the check', () => {
  it.each(KINDS)('passes on the clean %s line with all of the context known', (kind) => {
    expect(checkBatch(batch({ kind }), FULL_CONTEXT)).toMatchObject({
      findings: [],
      skipped: [{ code: 'brand-differs', reason: 'off' }],
    });
  });

  it('has a failing line here', () => {
    expect(FAILING.map(({ code }) => code).toSorted()).toEqual(RULES.map(({ code }) => code).toSorted());
  });

  it.each(FAILING)('$code fails alone', ({ code, context, expected, ...parts }) => {
    const { findings, records } = checkBatch(batch(parts), { ...FULL_CONTEXT, ...context });
    expect(findings.map((finding) => finding.code)).toEqual([code]);
    expect(findings[0]).toMatchObject(expected);
    expect(records[0]?.ruleCodes).toEqual(findings[0]?.kind === null ? [] : [code]);
  });
});
