import type { Agent } from '#tests/setup/api-harness.ts';
import { ok, type HandedInBatches } from './build-batches.ts';
import type { OwnObjects } from './own-objects.ts';

type Reviewers = Readonly<Record<'inspector' | 'engineer' | 'clerk', Agent>>;

/** Takes two of the batches; one stays under review, the other goes on record and out with a transmittal. */
export async function reviewBatches(options: {
  agents: Reviewers;
  handedIn: HandedInBatches;
}): Promise<OwnObjects> {
  const { agents, handedIn } = options;
  const { site, draft, queued, open, done } = handedIn;
  const { inspector, engineer, clerk } = agents;
  await ok(inspector.post(`/api/batches/${open.id}/take`), 200);
  const [, held] = open.findingIds;
  if (!held) throw new Error('The batch under review has no second finding.');
  const concessionAsked = await ask(inspector, held);

  await ok(inspector.post(`/api/batches/${done.id}/take`), 200);
  const concessionGranted = await ask(inspector, done.findingId);
  await ok(
    engineer
      .put(`/api/concessions/${concessionGranted}/decision`)
      .set('If-Match', '"1"')
      .send({ decision: 'grant', reason: 'Rock carries it.' }),
    200,
  );
  await ok(inspector.post(`/api/batches/${done.id}/approve-clean`), 200);
  await ok(inspector.post(`/api/batches/${done.id}/close-review`), 200);
  const entered = await ok<{ entries: { recordNumber: string }[] }>(
    clerk.post('/api/register/entries').send({ recordIds: done.recordIds }),
    201,
  );
  const issued = await ok(clerk.post('/api/transmittals').send({ scope: { workOrder: site.order.id } }), 202);
  return {
    orderId: site.order.id,
    orderNumber: site.order.number,
    draft,
    queued,
    open,
    done,
    concessionAsked,
    concessionGranted,
    recordNumber: entered.entries[0]?.recordNumber ?? '',
    transmittalId: issued.id,
    sheetFileId: handedIn.sheetFileId,
  };
}

async function ask(inspector: Agent, findingId: string): Promise<string> {
  const made = await ok(
    inspector.post(`/api/findings/${findingId}/concession`).send({ reason: 'Rock at 5.5 ft.' }),
    201,
  );
  return made.id;
}
