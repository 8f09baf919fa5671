import { afterAll, beforeAll, expect, it } from 'vitest';
import { run } from '#server/db/rows.ts';
import { enqueue } from '#server/jobs/enqueue.ts';
import { freeIdleReviewsJob } from '#server/modules/review/free-idle-reviews.job.ts';
import { createSubmittedBatch, type SubmittedBatch } from '#tests/factories/submitted-batch.ts';
import { createWorkSite } from '#tests/factories/work-site.ts';
import { createHarness, type Harness } from '#tests/setup/api-harness.ts';

let harness: Harness;
let batch: SubmittedBatch;
beforeAll(async () => {
  harness = await createHarness();
  const site = await createWorkSite(harness, { planned: ['L-1'] });
  batch = await createSubmittedBatch(harness.em(), {
    workOrder: { id: site.order.id, contractorId: site.contractor.orgId },
    lines: [{ structureNumber: 'L-1', findings: ['embedment-short'] }],
  });
});
afterAll(() => harness.close());

it('a review that nobody works on goes back to the queue after the stated days, and the trail says so', async () => {
  const inspector = await harness.signIn('inspector');
  const colleague = await harness.signIn('inspector');
  await colleague.post(`/api/batches/${batch.id}/take`);
  await enqueue(harness.em(), freeIdleReviewsJob, {});
  await harness.drain();
  expect((await inspector.get(`/api/batches/${batch.id}`)).body.status).toBe('in-review');
  await run(
    harness.em(),
    `update revisions set worked_at = now() - interval '73 hours' where batch_id = $1`,
    [batch.id],
  );
  await enqueue(harness.em(), freeIdleReviewsJob, {});
  await harness.drain();
  expect((await inspector.get(`/api/batches/${batch.id}`)).body).toMatchObject({
    status: 'submitted',
    can: ['take'],
  });
  const trail = await inspector.get(`/api/trail?action=batch.freed&subject=batch:${batch.id}`);
  expect(trail.body.items).toMatchObject([{ actor: null, payload: { afterDays: 3 } }]);
});
