import type { WorkbookInput } from '#server/workbook/write-workbook.ts';
import type { FindingRow, RecordRow } from '#shared/generated/api-types.ts';
import type { Agent, Harness } from '#tests/setup/api-harness.ts';
import { photograph } from './photograph.ts';
import type { WorkSite } from './work-site.ts';
import { workbookFile } from './workbook-file.ts';

export type HandedIn = { readonly id: string; readonly path: string; readonly number: string };

/** A new batch of the site's order. */
export async function startBatch(agent: Agent, site: WorkSite): Promise<HandedIn> {
  const { body, status } = await agent.post(`/api/work-orders/${site.order.id}/batches`);
  if (status !== 201) throw new Error(`The batch was not begun: ${status} ${JSON.stringify(body)}`);
  return { id: body.id, number: body.number, path: `/api/batches/${body.id}` };
}

/** Uploads a workbook and waits until its check is done or failed. */
export async function uploadWorkbook(
  harness: Harness,
  agent: Agent,
  options: { batch: HandedIn; site: WorkSite; workbook: Partial<WorkbookInput>; fileName?: string },
): Promise<{ input: number }> {
  const bytes = await workbookFile({ workOrder: options.site.order.number, ...options.workbook });
  const reply = await agent
    .put(`${options.batch.path}/workbook`)
    .attach('workbook', bytes, options.fileName ?? 'batch.xlsx');
  if (reply.status !== 202) throw new Error(`The workbook was refused: ${reply.status} ${reply.text}`);
  await harness.drain();
  return reply.body;
}

/** Uploads one photograph a file name. */
export async function uploadPhotographs(
  agent: Agent,
  batch: HandedIn,
  fileNames: readonly string[],
): Promise<{ input: number; files: { id: string; fileName: string }[] }> {
  const upload = agent.post(`${batch.path}/photos`);
  for (const name of fileNames) upload.attach('photos', await photograph(), name);
  const reply = await upload;
  if (reply.status !== 202) throw new Error(`The photographs were refused: ${reply.status} ${reply.text}`);
  return reply.body;
}

export async function findingsOf(agent: Agent, batch: HandedIn, query = ''): Promise<FindingRow[]> {
  const { body } = await agent.get(`${batch.path}/findings?limit=200${query}`);
  return body.items;
}

export async function recordsOf(agent: Agent, batch: HandedIn, query = ''): Promise<RecordRow[]> {
  const { body } = await agent.get(`${batch.path}/records?limit=200${query}`);
  return body.items;
}
