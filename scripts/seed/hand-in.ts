import { setTimeout as sleep } from 'node:timers/promises';
import type { CheckProgress, FindingRow, UploadReply } from '#shared/generated/api-types.ts';
import type { ApiClient } from './api-client.ts';
import { drawAll, makeWorkbook } from './make-batch-files.ts';
import type { BatchRows } from './story/build-batch-rows.ts';

const PHOTOGRAPHS_AT_ONCE = 20;
const CHECK_LIMIT_MS = 180_000;

/** Uploads workbook and photographs as the contractor and waits until both are checked. */
export async function handIn(
  contractor: ApiClient,
  options: { batchId: string; rows: BatchRows; fileName: string },
): Promise<void> {
  const { batchId, rows, fileName } = options;
  const photographs = await drawAll(rows.photographs);
  const workbook = await makeWorkbook(rows, fileName);
  let { input } = await contractor.upload<UploadReply>(`/api/batches/${batchId}/workbook`, {
    method: 'PUT',
    field: 'workbook',
    files: [workbook],
  });
  for (let from = 0; from < photographs.length; from += PHOTOGRAPHS_AT_ONCE) {
    const files = photographs.slice(from, from + PHOTOGRAPHS_AT_ONCE);
    const reply = await contractor.upload<UploadReply>(`/api/batches/${batchId}/photos`, {
      method: 'POST',
      field: 'photos',
      files,
    });
    const refused = reply.files.find((file) => file.error);
    if (refused?.error)
      throw new Error(`Photograph ${refused.fileName} was refused: ${refused.error.detail}`);
    input = reply.input;
  }
  await checked(contractor, { batchId, input });
}

async function checked(
  contractor: ApiClient,
  { batchId, input }: { batchId: string; input: number },
): Promise<void> {
  const end = Date.now() + CHECK_LIMIT_MS;
  for (;;) {
    const check = await contractor.get<CheckProgress>(`/api/batches/${batchId}/check`);
    if (check.input >= input && check.state === 'done') return;
    if (check.input >= input && check.state === 'failed')
      throw new Error(`The check failed: ${JSON.stringify(check.problem)}`);
    if (Date.now() > end)
      throw new Error(`The check of input ${input} was not done after ${CHECK_LIMIT_MS / 1000} s.`);
    await sleep(150);
  }
}

/** A batch's findings by `structure rule`, the key that the story uses. */
export async function findingsOf(client: ApiClient, batchId: string): Promise<Map<string, FindingRow>> {
  const { items } = await client.get<{ items: FindingRow[] }>(`/api/batches/${batchId}/findings?limit=200`);
  return new Map(items.map((finding) => [`${finding.structureNumber} ${finding.code}`, finding]));
}
