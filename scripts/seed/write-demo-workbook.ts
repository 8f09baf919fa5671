import { mkdir, writeFile } from 'node:fs/promises';
import path from 'node:path';
import { drawAll, makeWorkbook } from './make-batch-files.ts';
import { buildBatchRows } from './story/build-batch-rows.ts';

/** Structures of work order 17 that no batch of the demo has used yet; three of the lines want a look. */
const LINES = [
  { structureNumber: '17-0414', boredAt: '2026-06-09T07:45', lot: 'LK-2337' },
  { structureNumber: '17-0423', boredAt: '2026-06-09T08:40', lot: 'LK-2337', deviations: ['fill-short'] },
  { structureNumber: '17-0428', boredAt: '2026-06-09T09:35', lot: 'LK-2337' },
  { structureNumber: '17-0429', boredAt: '2026-06-09T10:30', lot: 'LK-2337', deviations: ['hardware-early'] },
  { structureNumber: '17-0430', boredAt: '2026-06-09T13:05', lot: 'LK-2337', deviations: ['photo-missing'] },
] as const;

const folder = path.resolve(process.argv[2] ?? 'var/demo-batch');
const rows = buildBatchRows({ workOrder: '17', lines: LINES });
const workbook = await makeWorkbook(rows, 'fallow-road-week24.xlsx');
const photographs = path.join(folder, 'photographs');
await mkdir(photographs, { recursive: true });
await writeFile(path.join(folder, workbook.name), workbook.bytes);
for (const { name, bytes } of await drawAll(rows.photographs))
  await writeFile(path.join(photographs, name), bytes);

console.log(`Written to ${folder}:
  ${workbook.name}   ${rows.set.length} poles
  photographs/   ${rows.photographs.length} files

Sign in as contractor@brindle.example, open work order 17 (Fallow Road tie line), begin a batch, and drop the
workbook and the photographs on its page.`);
