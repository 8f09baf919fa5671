import { describe, expect, it } from 'vitest';
import { checkBatch } from '#shared/check/check-batch.ts';
import { DEMO_CONTEXT } from '#shared/check/demo-context.ts';
import { cleanBatch } from '#shared/check/testing.ts';

const unproved = (values: Record<string, string | null>) =>
  checkBatch(cleanBatch({ set: values }), DEMO_CONTEXT)
    .findings.filter(({ code }) => code === 'unproved')
    .map(({ field, measured, severity }) => ({ field, measured, severity }));

describe('unproved', () => {
  it.each([['not-yet'], ['not-by-us'], ['2026-04-14T10:40']])('meets: a time that says %s', (hardwareAt) => {
    expect(unproved({ hardwareAt })).toEqual([]);
  });

  it('finds: a blank time that a rule needed, once', () => {
    expect(unproved({ hardwareAt: null })).toEqual([
      { field: 'hardwareAt', measured: null, severity: 'query' },
    ]);
  });

  it('finds: water not measured', () => {
    expect(unproved({ waterIn: 'not-measured' })).toEqual([
      { field: 'waterIn', measured: 'not-measured', severity: 'query' },
    ]);
  });

  it('is silent on a required field left blank: that is record-missing', () => {
    expect(unproved({ waterIn: null })).toEqual([]);
  });
});
