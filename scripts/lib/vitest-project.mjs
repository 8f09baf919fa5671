import { existsSync, readFileSync } from 'node:fs';
import { attempt } from './run.mjs';

/**
 * Runs one Vitest project and counts what it says.
 * @param {{name: string, root: string, env: NodeJS.ProcessEnv, resultFile: string, timeoutMs: number}} options
 */
export async function runProject({ name, root, env, resultFile, timeoutMs }) {
  const reporters = ['--reporter=default', '--reporter=json', `--outputFile.json=${resultFile}`];
  const args = ['node_modules/vitest/vitest.mjs', 'run', '--project', name, ...reporters];
  const { code, output } = await attempt(process.execPath, args, { cwd: root, env, timeoutMs, group: true });
  const report = existsSync(resultFile) ? JSON.parse(readFileSync(resultFile, 'utf8')) : null;
  return { ...countResults({ name, code, report }), output };
}

/**
 * Counts a report so that nothing can pass by not having run: a file that did not load, a test that was skipped, a
 * project without tests and a failing end each count as failed.
 * @param {{name: string, code: number, report: {testResults: {name: string, message?: string, status: string, assertionResults: {status: string, fullName: string}[]}[]} | null}} options
 */
export function countResults({ name, code, report }) {
  const files = report?.testResults ?? [];
  const tests = files.flatMap((file) => file.assertionResults);
  const passed = tests.filter((test) => test.status === 'passed').length;
  const failedTests = tests.filter((test) => test.status === 'failed').length;
  const skipped = tests.filter((test) => test.status !== 'passed' && test.status !== 'failed');
  const unloaded = files.filter(
    (file) => file.status === 'failed' && !file.assertionResults.some((test) => test.status === 'failed'),
  );
  const reasons = [
    ...skipped.map((test) => `${name}: did not run: ${test.fullName}`),
    ...unloaded.map((file) => `${name}: failed as a whole: ${file.name}`),
  ];
  if (tests.length === 0 && unloaded.length === 0) reasons.push(`${name}: no test ran.`);
  const failed = failedTests + reasons.length;
  if (failed > 0 || code === 0) return { passed, failed, reasons };
  return { passed, failed: 1, reasons: [`${name}: every test passed, yet Vitest ended with ${code}.`] };
}
