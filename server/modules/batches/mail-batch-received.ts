import type { EntityManager } from '@mikro-orm/postgresql';
import { row } from '#server/db/rows.ts';
import { queueMail } from '#server/mail/queue-mail.ts';
import { recipients } from '#server/mail/recipients.ts';
import type { Actor } from '#shared/permissions/ability.ts';
import type { LockedRevision } from './lock-revision.ts';

/** Tells the contractor's people that it is received, and the inspectors that it waits. */
export async function mailBatchReceived(
  em: EntityManager,
  handed: { revision: LockedRevision; actor: Actor },
): Promise<void> {
  const { revision, actor } = handed;
  const order = await row<{ number: string }>(em, 'select number from work_orders where id = $1', [
    revision.work_order_id,
  ]);
  const data = {
    batchId: revision.batch_id,
    batchNumber: revision.batch_number,
    revision: revision.n,
    workOrder: order?.number ?? '',
    contractor: actor.orgName,
    submittedBy: actor.name,
    lines: revision.counts?.lines ?? 0,
    nonconformities: revision.counts?.nonconformity ?? 0,
    queries: revision.counts?.query ?? 0,
  };
  // The run tells two submissions of one revision apart, after a withdrawal and another upload.
  const event = `batch.submitted:${revision.id}:${revision.run_id}`;
  for (const recipient of await recipients(em, { orgId: revision.contractor_id }))
    await queueMail(em, {
      event,
      recipient,
      template: 'batch-received',
      data: { ...data, audience: 'contractor' },
    });
  for (const recipient of await recipients(em, { role: 'inspector' }))
    await queueMail(em, {
      event,
      recipient,
      template: 'batch-received',
      data: { ...data, audience: 'inspector' },
    });
}
