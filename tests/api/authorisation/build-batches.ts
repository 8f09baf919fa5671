import type { Batch, FindingRow, Photo, RecordRow } from '#shared/generated/api-types.ts';
import type { RowInput } from '#server/workbook/write-workbook.ts';
import { photograph } from '#tests/factories/photograph.ts';
import { pourRows, SET_VIEWS, setRow } from '#tests/factories/set-row.ts';
import type { WorkSite } from '#tests/factories/work-site.ts';
import { workbookFile } from '#tests/factories/workbook-file.ts';
import type { Agent, Stage } from '#tests/setup/api-harness.ts';
import type { BatchObjects } from './own-objects.ts';

type Name = 'draft' | 'queued' | 'open' | 'done';
export type HandedInBatches = { readonly site: WorkSite; readonly sheetFileId: string } & Readonly<
  Record<Name, BatchObjects>
>;

/** Due 6.0 ft: this one is half a foot short and has one nonconformity. */
const short = (structureNumber: string): RowInput => setRow(structureNumber, { embedmentFt: 5.5 });

/** Four batches of one contractor, each with photographs and checked; three are handed in. */
export async function buildBatches(
  harness: Stage,
  options: { site: WorkSite; agent: Agent; prefix: string },
): Promise<HandedInBatches> {
  const { site, agent, prefix } = options;
  const lines: Readonly<Record<Name, RowInput[]>> = {
    draft: [short(`${prefix}-draft`)],
    queued: [short(`${prefix}-queued`)],
    open: [short(`${prefix}-open-1`), short(`${prefix}-open-2`)],
    done: [setRow(`${prefix}-done-1`), short(`${prefix}-done-2`)],
  };
  const begun = {} as Record<Name, { id: string; number: string }>;
  for (const name of Object.keys(lines) as Name[]) {
    begun[name] = await ok(agent.post(`/api/work-orders/${site.order.id}/batches`), 201);
    await upload({ site, agent, batchId: begun[name].id, set: lines[name] });
  }
  await harness.drain();
  for (const name of ['queued', 'open', 'done'] as const)
    await ok(agent.post(`/api/batches/${begun[name].id}/submit`), 200);
  const sheets = await ok(
    agent.post(`/api/batches/${begun.queued.id}/sheets`).send({ paper: 'letter' }),
    202,
  );
  return {
    site,
    sheetFileId: sheets.id,
    draft: await readObjects(agent, begun.draft),
    queued: await readObjects(agent, begun.queued),
    open: await readObjects(agent, begun.open),
    done: await readObjects(agent, begun.done),
  };
}

async function upload(options: {
  site: WorkSite;
  agent: Agent;
  batchId: string;
  set: readonly RowInput[];
}): Promise<void> {
  const { site, agent, batchId, set } = options;
  const names = set.map((row) => String(row['structureNumber']));
  const workbook = await workbookFile({
    workOrder: site.order.number,
    contractor: site.contractor.orgName,
    set,
    pours: names.flatMap((name) => pourRows(name, site.lot.number)),
  });
  await ok(agent.put(`/api/batches/${batchId}/workbook`).attach('workbook', workbook, 'batch.xlsx'), 202);
  const photos = agent.post(`/api/batches/${batchId}/photos`);
  for (const name of names)
    for (const view of SET_VIEWS) photos.attach('photos', await photograph(), `${name} ${view}.jpg`);
  await ok(photos, 202);
}

/** What the contractor's own lists name. Throws where they name nothing: a wall needs something behind it. */
async function readObjects(agent: Agent, batch: { id: string; number: string }): Promise<BatchObjects> {
  const path = `/api/batches/${batch.id}`;
  const { revision } = await ok<Batch>(agent.get(path), 200);
  const records = (await ok<{ items: RecordRow[] }>(agent.get(`${path}/records`), 200)).items;
  const findings = (await ok<{ items: FindingRow[] }>(agent.get(`${path}/findings`), 200)).items;
  const photos = (await ok<{ items: Photo[] }>(agent.get(`${path}/photos`), 200)).items;
  const [record] = records;
  const finding = findings.find((one) => one.severity !== 'note');
  const photo = photos.find((one) => one.lineId !== null);
  if (!record || !finding || !photo)
    throw new Error(`Batch ${batch.number} lacks a record, a finding or a placed photograph.`);
  return {
    id: batch.id,
    number: batch.number,
    revisionId: revision.id,
    lineId: record.lineId,
    recordId: record.id,
    recordIds: records.map((one) => one.id),
    findingId: finding.id,
    findingIds: findings.filter((one) => one.severity !== 'note').map((one) => one.id),
    photoId: photo.id,
    structures: records.map((one) => one.structureNumber ?? ''),
  };
}

/** The reply's body. @throws when the status is another: set-up that fails must say where. */
export async function ok<T = { id: string; number: string }>(
  asked: PromiseLike<{ status: number; text: string; body: unknown }>,
  status: number,
): Promise<T> {
  const reply = await asked;
  if (reply.status !== status) throw new Error(`Expected ${status}, got ${reply.status}: ${reply.text}`);
  return reply.body as T;
}
