import type { RowInput } from '#server/workbook/write-workbook.ts';
import type { Agent, Stage } from '#tests/setup/api-harness.ts';
import { photograph } from './photograph.ts';
import { pourRows, SET_VIEWS } from './set-row.ts';
import type { WorkSite } from './work-site.ts';
import { workbookFile } from './workbook-file.ts';

export type HandedIn = { readonly id: string; readonly number: string };

/** A new batch of these lines, handed in by the contractor through the API with every photograph, checked and submitted. */
export async function handIn(
  harness: Stage,
  options: { site: WorkSite; agent: Agent; set: readonly RowInput[] },
): Promise<HandedIn> {
  const { site, agent } = options;
  const created = await agent.post(`/api/work-orders/${site.order.id}/batches`);
  const { id, number } = created.body as HandedIn;
  await uploadLines(harness, { ...options, batchId: id });
  const submitted = await agent.post(`/api/batches/${id}/submit`);
  if (submitted.status !== 200) throw new Error(`Batch ${number} was not submitted: ${submitted.text}`);
  return { id, number };
}

/** Workbook and photographs of these lines on an open batch, checked. */
export async function uploadLines(
  harness: Stage,
  options: { site: WorkSite; agent: Agent; set: readonly RowInput[]; batchId: string },
): Promise<void> {
  const { site, agent, set, batchId } = options;
  const names = set.map((row) => String(row['structureNumber']));
  const workbook = await workbookFile({
    workOrder: site.order.number,
    contractor: site.contractor.orgName,
    set,
    pours: names.flatMap((name) => pourRows(name, site.lot.number)),
  });
  await agent.put(`/api/batches/${batchId}/workbook`).attach('workbook', workbook, 'batch.xlsx');
  const upload = agent.post(`/api/batches/${batchId}/photos`);
  for (const name of names)
    for (const view of SET_VIEWS) upload.attach('photos', await photograph(), `${name} ${view}.jpg`);
  const stored = await upload;
  if (stored.status !== 202) throw new Error(`The photographs were not stored: ${stored.text}`);
  await harness.drain();
}
