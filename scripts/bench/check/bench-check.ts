/**
 * Times the check of a large workbook, step by step, beside a script in Python that applies two of its rules:
 * `npm run bench:check -- [LINES] [RUNS]` (10,000 and 3). Every step is a process of its own, its start included: the
 * reader alone; reader and records; the whole as the worker does it, with all rules, lots, design list and photographs,
 * until the last row is ready to be stored. Prints medians and ratios, and fails where the script finds otherwise.
 */
import { mkdtemp, rm, stat } from 'node:fs/promises';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { median } from '#scripts/bench/lib/stats.ts';
import { buildChildPrograms } from '#scripts/lib/child-programs.mjs';
import { machine } from '#scripts/bench/machine.ts';
import { writeBenchWorkbook } from './bench-workbook.ts';
import { compareFindings } from './compare-findings.ts';
import { buildStep, runOpenpyxl, runStep } from './run-steps.ts';
import { wholeCheck } from './whole-check.ts';

// As the product runs: plain files, as `npm start` builds them.
process.env['CHILD_PROGRAMS'] = await buildChildPrograms(
  fileURLToPath(new URL('../../../', import.meta.url)),
);
const step = await buildStep();
const [lines = 10_000, runs = 3] = process.argv.slice(2).map(Number);
const folder = await mkdtemp(join(tmpdir(), 'upstand-bench-'));
try {
  const file = join(folder, 'bench.xlsx');
  await writeBenchWorkbook(file, lines);
  const size = (await stat(file)).size / 1024 / 1024;
  let found = await wholeCheck(file, lines);
  const script = await runOpenpyxl(file);
  const steps = [
    { name: 'reader alone', run: () => runStep(step, 'read', file) },
    { name: 'reader and records', run: () => runStep(step, 'records', file) },
    { name: 'whole, all rules', run: async () => void (found = await wholeCheck(file, lines)) },
    { name: 'openpyxl script, two rules', run: async () => void (await runOpenpyxl(file)) },
  ];
  const times = steps.map((): number[] => []);
  // In turn, so that a change of the machine's load meets all of them; the runs above have warmed up.
  for (let run = 0; run < runs; run += 1)
    for (const [index, step] of steps.entries()) {
      const began = performance.now();
      await step.run();
      times[index]?.push(performance.now() - began);
    }
  console.log(machine());
  console.log(
    `${lines} lines, ${script.pours} pour rows, ${size.toFixed(1)} MB; ${found.findings} findings; median of ${runs} runs`,
  );
  const medians = times.map(median);
  const [alone = Number.NaN] = medians;
  for (const [index, { name }] of steps.entries()) {
    const ms = medians[index] ?? Number.NaN;
    console.log(
      `  ${name.padEnd(30)} ${(ms / 1000).toFixed(2).padStart(7)} s   × ${(ms / alone).toFixed(2)}`,
    );
  }
  const [, , whole = Number.NaN, python = Number.NaN] = medians;
  console.log(`  whole to script                            × ${(whole / python).toFixed(2)}`);
  console.log(compareFindings(found, script));
} finally {
  await rm(folder, { recursive: true, force: true });
}
