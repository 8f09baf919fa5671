/**
 * Times the check of a large workbook, step by step: `npm run bench:check -- [LINES] [RUNS]` (10,000 and 3).
 * The reader alone in its child process; reader and source rows; all of it with records and rules, on the demo standard
 * with lots, design list and photographs known. Prints the median of each and its ratio to the reader alone.
 */
import { mkdtemp, rm, stat } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { readWorkbookFile } from '#server/workbook/read-workbook-file.ts';
import { checkBatch } from '#shared/check/check-batch.ts';
import { readSource } from '#shared/workbook/read-source.ts';
import { benchContext, writeBenchWorkbook } from './bench-workbook.ts';

const [lines = 10_000, runs = 3] = process.argv.slice(2).map(Number);
const folder = await mkdtemp(join(tmpdir(), 'upstand-bench-'));
try {
  const file = join(folder, 'bench.xlsx');
  await writeBenchWorkbook(file, lines);
  const context = benchContext(lines);
  const limits = { timeLimitMs: 120_000 };
  const times: number[][] = [];
  let findings = 0;
  // One run to warm up, which is not counted.
  for (let run = 0; run <= runs; run += 1) {
    const t0 = performance.now();
    const workbook = await readWorkbookFile(file, limits);
    const t1 = performance.now();
    const source = readSource(workbook);
    const t2 = performance.now();
    findings = checkBatch(source, context).findings.length;
    const t3 = performance.now();
    if (run > 0) times.push([t1 - t0, t2 - t0, t3 - t0]);
  }
  const median = (step: number) =>
    times.map((one) => one[step] ?? 0).toSorted((a, b) => a - b)[Math.floor(times.length / 2)] ?? 0;
  const alone = median(0);
  const size = (await stat(file)).size / 1024 / 1024;
  console.log(
    `${lines} lines, ${lines * 2} pour rows, ${size.toFixed(1)} MB; ${findings} findings; median of ${runs} runs`,
  );
  for (const [step, name] of [
    'reader alone',
    'reader and source rows',
    'whole, with records and rules',
  ].entries())
    console.log(
      `  ${name.padEnd(32)} ${(median(step) / 1000).toFixed(2).padStart(7)} s   × ${(median(step) / alone).toFixed(2)}`,
    );
} finally {
  await rm(folder, { recursive: true, force: true });
}
