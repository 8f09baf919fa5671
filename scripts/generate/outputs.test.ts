import { spawnSync } from 'node:child_process';
import { readFile } from 'node:fs/promises';
import { join } from 'node:path';
import { expect, test } from 'vitest';
import { outputs } from './outputs.ts';
import { ROOT } from './schema-files.ts';

test('the checked-in generated files are what the schemas give', async () => {
  const stale: string[] = [];
  for (const [path, text] of await outputs()) {
    if ((await readFile(join(ROOT, path), 'utf8')) !== text) stale.push(path);
  }
  expect(stale, 'run npm run generate').toEqual([]);
}, 60_000);

test('the validators run where code may not be made from strings, as under a strict content-security policy', () => {
  const script = `
    import { validateRecord } from './shared/generated/validators.mjs';
    console.log(validateRecord('photo', { fileName: 'a.jpg', structureNumber: '7', view: 'selfie' })[0].field);
  `;
  const flags = ['--disallow-code-generation-from-strings', '--input-type=module', '--eval', script];
  const run = spawnSync(process.execPath, flags, { cwd: ROOT, encoding: 'utf8', env: {} });
  expect(run.stderr).toBe('');
  expect(run.stdout).toBe('view\n');
});
