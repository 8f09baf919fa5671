import { existsSync, mkdirSync, mkdtempSync, rmSync, utimesSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, expect, it } from 'vitest';
import { withTempFolder } from './temp-folder.ts';

const base = mkdtempSync(join(tmpdir(), 'temp-folder-test-'));
const before = process.env['TMPDIR'];
process.env['TMPDIR'] = base;
afterAll(() => {
  process.env['TMPDIR'] = before;
  rmSync(base, { recursive: true, force: true });
});

it('is gone when the task ends, even when it fails', async () => {
  let seen = '';
  const failing = withTempFolder('ours-', async (folder) => {
    seen = folder;
    writeFileSync(join(folder, 'a'), 'x');
    throw new Error('no');
  });
  await expect(failing).rejects.toThrow('no');
  expect(existsSync(seen)).toBe(false);
});

it('takes away what a killed process left long ago, and nothing else', async () => {
  const paths = ['ours-old', 'ours-new', 'theirs-old'].map((name) => join(base, name));
  for (const path of paths) mkdirSync(path);
  const [old, fresh, theirs] = paths as [string, string, string];
  for (const path of [old, theirs]) utimesSync(path, 1_000, 1_000);
  await withTempFolder('ours-', async () => undefined);
  expect([old, fresh, theirs].map((path) => existsSync(path))).toEqual([false, true, true]);
});
