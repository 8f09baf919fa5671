import type { EntityManager } from '@mikro-orm/postgresql';
import { rows } from '#server/db/rows.ts';
import { queueMail } from '#server/mail/queue-mail.ts';
import { recipients } from '#server/mail/recipients.ts';

type Blocked = {
  lot: { id: string; number: string; product: string };
  eventId: string;
  status: 'held' | 'recalled';
  reason: string;
  by: string;
};

/** Tells every contractor that used the lot, drafts included, and names their own structures only. */
export async function mailLotBlocked(em: EntityManager, blocked: Blocked): Promise<void> {
  const { lot, eventId, ...rest } = blocked;
  const users = await rows<{ contractor_id: string; structures: string[] }>(
    em,
    `select r.contractor_id, array_agg(distinct r.structure_number order by r.structure_number) as structures
     from records r join revisions v on v.run_id = r.run_id where r.lot_ids && array[$1::uuid] group by r.contractor_id`,
    [lot.id],
  );
  for (const { contractor_id: orgId, structures } of users)
    for (const recipient of await recipients(em, { orgId }))
      await queueMail(em, {
        event: `lot.${blocked.status}:${eventId}`,
        recipient,
        template: 'lot-blocked',
        data: { ...rest, lotId: lot.id, lotNumber: lot.number, product: lot.product, structures },
      });
}
