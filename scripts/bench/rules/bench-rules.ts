/**
 * Times calc and rules over records already parsed: `npm run bench:rules -- [RUNS]` (3).
 * 10,000 and 100,000 lines of the three kinds with all of their context known, beside JSON Schema validation alone of the
 * same rows in the same run. Prints the median of each, its ratio to the validation, and how it grows.
 */
import { checkBatch } from '#shared/check/check-batch.ts';
import { validateRecord } from '#shared/generated/validators.mjs';
import type { SourceBatch } from '#shared/records/types.ts';
import { machine } from '../machine.ts';
import { contextOfMany, manyLines } from './many-lines.ts';

const runs = Number(process.argv[2] ?? 3);
const SIZES = [10_000, 100_000];

const median = (times: readonly number[]): number =>
  times.toSorted((a, b) => a - b)[Math.floor(times.length / 2)] ?? 0;

const validateAll = (source: SourceBatch): number => {
  let faults = 0;
  for (const line of source.lines) faults += validateRecord(line.kind, line.values).length;
  for (const pour of source.pours) faults += validateRecord('pour', pour.values).length;
  return faults;
};

console.log(machine());
const whole: number[] = [];
for (const lines of SIZES) {
  const source = manyLines(lines);
  const context = contextOfMany(lines);
  const alone: number[] = [];
  const checked: number[] = [];
  let findings = 0;
  // One run to warm up, which is not counted.
  for (let run = 0; run <= runs; run += 1) {
    const t0 = performance.now();
    if (validateAll(source) > 0) throw new Error('The rows of this bench are valid.');
    const t1 = performance.now();
    findings = checkBatch(source, context).findings.length;
    const t2 = performance.now();
    if (run > 0) {
      alone.push(t1 - t0);
      checked.push(t2 - t1);
    }
  }
  whole.push(median(checked));
  console.log(
    `${lines} lines, ${source.pours.length} pours, ${findings} findings; median of ${runs}: validation alone ` +
      `${median(alone).toFixed(0)} ms, calc and rules ${median(checked).toFixed(0)} ms, × ${(median(checked) / median(alone)).toFixed(2)}`,
  );
}
const [small = 0, large = 0] = whole;
console.log(`Ten times the lines take ${(large / small).toFixed(1)} times as long.`);
