import { describe, expect, it } from 'vitest';
import { countResults } from './vitest-project.mjs';

const test = (status: string) => ({ status, fullName: `a ${status} test` });
const file = (status: string, ...statuses: string[]) => ({
  name: 'a.test.ts',
  status,
  assertionResults: statuses.map(test),
});

describe('countResults', () => {
  it('counts what passed and failed', () => {
    const report = { testResults: [file('failed', 'passed', 'failed'), file('passed', 'passed')] };
    expect(countResults({ name: 'unit', code: 1, report })).toEqual({ passed: 2, failed: 1, reasons: [] });
  });

  it.each([
    ['no report', 1, null],
    ['no file', 0, { testResults: [] }],
    ['a file without tests', 0, { testResults: [file('passed')] }],
    ['a file that did not load', 1, { testResults: [file('failed')] }],
    ['a skipped test', 0, { testResults: [file('passed', 'pending')] }],
    ['a test to be written', 0, { testResults: [file('passed', 'todo')] }],
    ['a failing end', 1, { testResults: [file('passed', 'passed')] }],
  ])('lets nothing pass that did not run: %s', (_, code, report) => {
    const { failed, reasons } = countResults({ name: 'unit', code, report });
    expect(failed).toBe(1);
    expect(reasons).toHaveLength(1);
  });
});
