/**
 * Runs the reader over a folder of workbooks that others wrote: `npm run corpus -- FOLDER [EXPECTED]`.
 * EXPECTED (else FOLDER/expected, else FOLDER/../expected) holds agreed contents as FILE.json.gz. Prints how many are
 * equal, read without agreed contents, refused by code, different; the slowest and the one that needed most memory.
 * Ends with 1 when a reading differs from what was agreed.
 */
import { readdir, stat } from 'node:fs/promises';
import { join } from 'node:path';
import { readWorkbookFile } from '#server/workbook/read-workbook-file.ts';
import { refusalText } from '#shared/workbook/refusal-text.ts';
import { WorkbookRefused } from '#shared/workbook/workbook-refused.ts';
import { readAgreed } from './agreed-cells.ts';
import { watchChildren } from './children-memory.ts';
import { differences } from './differences.ts';

const WORKBOOK = /\.xls[xmb]?$/i;
const SHOWN = 8;

type Outcome = {
  readonly file: string;
  readonly verdict: string;
  readonly seconds: number;
  readonly memory: number;
};

async function expectedFolder(folder: string, given: string | undefined): Promise<string> {
  for (const path of [given, join(folder, 'expected'), join(folder, '..', 'expected')]) {
    if (path !== undefined && (await stat(path).catch(() => null))?.isDirectory()) return path;
  }
  return join(folder, 'expected');
}

async function readOne(folder: string, file: string, expected: string): Promise<Outcome> {
  const agreed = await readAgreed(expected, file);
  const watch = watchChildren();
  const start = performance.now();
  let verdict = '';
  try {
    const workbook = await readWorkbookFile(join(folder, file));
    const found = agreed === null ? null : differences(workbook, agreed);
    verdict = found === null ? 'read, nothing agreed' : found.length === 0 ? 'equal' : 'DIFFERENT';
    for (const line of found?.slice(0, SHOWN) ?? []) console.log(`  ${file} ${line}`);
    if (found && found.length > SHOWN) console.log(`  ${file} and ${found.length - SHOWN} more`);
  } catch (error) {
    if (!(error instanceof WorkbookRefused)) throw error;
    verdict = `refused ${error.code}${agreed === null ? '' : ', though agreed'}`;
    console.log(`  ${file} ${error.code}: ${refusalText(error)}`);
  }
  return { file, verdict, seconds: (performance.now() - start) / 1000, memory: await watch.stop() };
}

const [folder, given] = process.argv.slice(2);
if (folder === undefined) {
  console.error('npm run corpus -- FOLDER [EXPECTED]');
  process.exit(2);
}
const expected = await expectedFolder(folder, given);
const outcomes: Outcome[] = [];
for (const file of (await readdir(folder)).filter((name) => WORKBOOK.test(name)).toSorted()) {
  outcomes.push(await readOne(folder, file, expected));
}

const counts = new Map<string, number>();
for (const { verdict } of outcomes) counts.set(verdict, (counts.get(verdict) ?? 0) + 1);
console.log(`${outcomes.length} files`);
for (const [verdict, count] of [...counts].toSorted(([a], [b]) => a.localeCompare(b)))
  console.log(`  ${verdict.padEnd(32)} ${count}`);
const most = (by: 'seconds' | 'memory') => outcomes.toSorted((a, b) => b[by] - a[by])[0];
const [slowest, largest] = [most('seconds'), most('memory')];
if (slowest) console.log(`slowest ${slowest.seconds.toFixed(2)} s, ${slowest.file}`);
if (largest) console.log(`largest ${(largest.memory / 1e6).toFixed(0)} MB, ${largest.file}`);
if (counts.has('DIFFERENT')) process.exitCode = 1;
