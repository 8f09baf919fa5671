import type { EntityManager } from '@mikro-orm/postgresql';
import { row } from '#server/db/rows.ts';
import { queueMail } from '#server/mail/queue-mail.ts';
import { recipients } from '#server/mail/recipients.ts';
import { toFinding } from '#server/modules/records/finding-facts.ts';
import { renderFinding } from '#shared/findings/render.ts';
import type { Actor } from '#shared/permissions/ability.ts';
import { CONCESSION_SELECT, type ConcessionDbRow, type ConcessionFindingRow } from './concession-select.ts';

type Options = { concessionId: string; actor: Actor };
type MailedConcession = ConcessionDbRow & { work_order: string; asked_by_id: string | null };

/** Tells every engineer that a concession waits; any of them may answer. */
export async function mailConcessionAsked(
  em: EntityManager,
  { concessionId, actor }: Options,
): Promise<void> {
  const concession = await read(em, concessionId);
  for (const recipient of await recipients(em, { role: 'engineer' })) {
    await queueMail(em, {
      event: `concession.asked:${concession.id}`,
      recipient,
      template: 'concession-asked',
      data: {
        concessionId: concession.id,
        number: concession.number,
        batchNumber: concession.batch_number,
        workOrder: concession.work_order,
        contractor: concession.contractor_name,
        askedBy: actor.name,
        reason: concession.reason,
        findings: concession.findings.map(describe),
      },
    });
  }
}

/** Tells the inspector who asked, and the contractor's people, what the engineer answered. */
export async function mailConcessionAnswered(
  em: EntityManager,
  { concessionId, actor }: Options,
): Promise<void> {
  const concession = await read(em, concessionId);
  const asker = concession.asked_by_id ? await recipients(em, { userIds: [concession.asked_by_id] }) : [];
  for (const recipient of [...asker, ...(await recipients(em, { orgId: concession.contractor_id }))]) {
    await queueMail(em, {
      event: `concession.answered:${concession.id}:${concession.version}`,
      recipient,
      template: 'concession-answered',
      data: {
        concessionId: concession.id,
        number: concession.number,
        batchNumber: concession.batch_number,
        answer: concession.state === 'granted' ? 'granted' : 'refused',
        engineer: actor.name,
        reason: concession.decision_reason ?? '',
        condition: concession.condition,
        endsOn: concession.ends_on,
        structures: [...new Set(concession.findings.flatMap(({ structure_number: number }) => number ?? []))],
      },
    });
  }
}

async function read(em: EntityManager, id: string): Promise<MailedConcession> {
  const found = await row<MailedConcession>(
    em,
    `select k.*, w.number || ' ' || w.title as work_order, own.asked_by as asked_by_id
     from (${CONCESSION_SELECT} where c.id = $1) k
     join concessions own on own.id = k.id join work_orders w on w.id = own.work_order_id`,
    [id],
  );
  if (!found) throw new Error('The concession to write about is gone.');
  return found;
}

function describe(row: ConcessionFindingRow): { structureNumber: string; finding: string; detail: string } {
  const { title, message } = renderFinding(toFinding(row, false));
  return { structureNumber: row.structure_number ?? '', finding: title, detail: message };
}
