import { readFile } from 'node:fs/promises';
import { setTimeout as sleep } from 'node:timers/promises';
import { seedPhotographs } from './bench-site.ts';
import type { Client } from './client.ts';
import type { Bench } from './start-bench.ts';

/**
 * A new batch with four photographs a line, its workbook, and its check until it is done. Gives the batch's id.
 * @throws when the check failed
 */
export async function checkBatchOverHttp(
  bench: Bench,
  client: Client,
  file: { orderId: string; workbook: string; lines: number },
): Promise<string> {
  const { id } = await client.send<{ id: string }>('POST', `/api/work-orders/${file.orderId}/batches`);
  await seedPhotographs(bench, { batchId: id, lines: file.lines });
  const form = new FormData();
  form.set('workbook', new Blob([await readFile(file.workbook)]), 'bench.xlsx');
  await client.send('PUT', `/api/batches/${id}/workbook`, { form });
  for (;;) {
    const { state, problem } = await client.get<{ state: string; problem: unknown }>(
      `/api/batches/${id}/check`,
    );
    if (state === 'failed') throw new Error(`The check failed: ${JSON.stringify(problem)}`);
    if (state === 'done') return id;
    await sleep(100);
  }
}
