import { mkdir, readFile, writeFile } from 'node:fs/promises';
import { dirname, join } from 'node:path';
import { outputs } from './outputs.ts';
import { ROOT } from './schema-files.ts';

async function stale(path: string, text: string): Promise<boolean> {
  return (await readFile(join(ROOT, path), 'utf8').catch(() => null)) !== text;
}

const check = process.argv.includes('--check');
const old: string[] = [];
for (const [path, text] of await outputs()) {
  if (!(await stale(path, text))) continue;
  old.push(path);
  if (check) continue;
  await mkdir(dirname(join(ROOT, path)), { recursive: true });
  await writeFile(join(ROOT, path), text);
}
if (old.length === 0) console.log('Generated files are up to date.');
else if (check) {
  console.error(`Stale: ${old.join(', ')}. Run npm run generate and commit what it writes.`);
  process.exitCode = 1;
} else console.log(`Written: ${old.join(', ')}.`);
