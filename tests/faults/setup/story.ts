import { handIn } from '#tests/factories/hand-in.ts';
import { photograph } from '#tests/factories/photograph.ts';
import { pourRows, setRow } from '#tests/factories/set-row.ts';
import { startBatch, type HandedIn } from '#tests/factories/start-batch.ts';
import { workbookFile } from '#tests/factories/workbook-file.ts';
import { createWorkSite, type WorkSite } from '#tests/factories/work-site.ts';
import type { Agent } from '#tests/setup/api-harness.ts';
import type { FaultStage } from './fault-stage.ts';

/** The people at work, and one line on record, so that there is something to issue. */
export type Story = {
  readonly site: WorkSite;
  readonly contractor: Agent;
  readonly clerk: Agent;
  readonly admin: Agent;
};

/** Asked for when a test runs: the stage is made before the first of them. */
export type World = () => { readonly stage: FaultStage; readonly story: Story };

const PLANNED = Array.from({ length: 20 }, (_, index) => `L-${index + 1}`);

export async function beginStory(stage: FaultStage): Promise<Story> {
  const site = await createWorkSite(stage, { planned: PLANNED, number: '17' });
  const [contractor, clerk, admin, inspector] = await Promise.all([
    stage.signIn(site.contractor),
    stage.signIn('clerk'),
    stage.signIn('administrator'),
    stage.signIn('inspector'),
  ]);
  const batch = await handIn(stage, { site, agent: contractor, set: [setRow('L-1')] });
  await inspector.post(`/api/batches/${batch.id}/take`);
  await inspector.post(`/api/batches/${batch.id}/approve-clean`);
  await inspector.post(`/api/batches/${batch.id}/close-review`);
  const { body } = await clerk.get('/api/register/candidates');
  const recordIds = (body.items as { recordId: string }[]).map((one) => one.recordId);
  const entered = await clerk.post('/api/register/entries').send({ recordIds });
  if (entered.status !== 201) throw new Error(`Nothing is on record: ${entered.text}`);
  await stage.rest();
  return { site, contractor, clerk, admin };
}

export const openBatch = ({ contractor, site }: Story): Promise<HandedIn> => startBatch(contractor, site);

/** A repeat with the same key is answered as the first was. */
export const createBatch = ({ contractor, site }: Story, key: string) =>
  contractor.post(`/api/work-orders/${site.order.id}/batches`).set('Idempotency-Key', key);

/** A workbook of one line that meets every rule but the photographs. */
export function oneLine({ site }: Story, structureNumber: string): Promise<Buffer> {
  return workbookFile({
    workOrder: site.order.number,
    contractor: site.contractor.orgName,
    set: [setRow(structureNumber)],
    pours: pourRows(structureNumber, site.lot.number),
  });
}

export const putWorkbook = (story: Story, batch: HandedIn, bytes: Buffer) =>
  story.contractor.put(`${batch.path}/workbook`).attach('workbook', bytes, 'batch.xlsx');

export const postPhoto = async (
  story: Story,
  batch: HandedIn,
  name: string,
  size: { width?: number; height?: number } = {},
) => story.contractor.post(`${batch.path}/photos`).attach('photos', await photograph(size), name);

export const askTransmittal = (story: Story) =>
  story.clerk.post('/api/transmittals').send({ scope: { filter: {} } });
