import type { EntityManager } from '@mikro-orm/postgresql';
import { row, rows } from '#server/db/rows.ts';
import { queueMail } from '#server/mail/queue-mail.ts';
import { recipients } from '#server/mail/recipients.ts';
import type { ReturnedFinding } from '#server/mail/templates/batch-returned.ts';
import type { LockedRevision } from '#server/modules/batches/lock-revision.ts';
import { FINDING_SELECT, type FindingDbRow } from '#server/modules/records/finding-select.ts';
import { toFinding } from '#server/modules/records/finding-facts.ts';
import { renderFinding } from '#shared/findings/render.ts';
import type { Actor } from '#shared/permissions/ability.ts';
import type { Closing } from '#shared/review/close-review.ts';
import type { ActionDue } from '#shared/review/states.ts';

const DUE: Readonly<Record<ActionDue, string>> = {
  correct: 'correct the record',
  rework: 'rework',
  repair: 'repair',
};

/** Writes to the contractor's people what the review came to: a table of what came back and why, or that all is approved. */
export async function mailReviewClosed(
  em: EntityManager,
  options: {
    revision: LockedRevision;
    closing: Closing;
    nextRevision: number | null;
    dueOn: string | null;
    actor: Actor;
  },
): Promise<void> {
  const { revision, closing, nextRevision, dueOn, actor } = options;
  const workOrder = await workOrderName(em, revision.work_order_id);
  const counts = { approved: closing.approved.length, held: closing.held.length };
  const head = {
    batchId: revision.batch_id,
    batchNumber: revision.batch_number,
    workOrder,
    inspector: actor.name,
  };
  const findings = nextRevision === null ? [] : await returnedFindings(em, revision.id);
  for (const recipient of await recipients(em, { orgId: revision.contractor_id })) {
    if (nextRevision === null)
      await queueMail(em, {
        event: `review.closed:${revision.id}`,
        recipient,
        template: 'batch-approved',
        data: { ...head, ...counts, revision: revision.n },
      });
    else
      await queueMail(em, {
        event: `review.closed:${revision.id}`,
        recipient,
        template: 'batch-returned',
        data: { ...head, ...counts, nextRevision, dueOn, returned: closing.returned.length, findings },
      });
  }
}

async function workOrderName(em: EntityManager, id: string): Promise<string> {
  const order = await row<{ name: string }>(
    em,
    `select number || ' ' || title as name from work_orders where id = $1`,
    [id],
  );
  return order?.name ?? '';
}

/** What came back: each rejected finding, and each line returned as a whole. */
async function returnedFindings(em: EntityManager, revisionId: string): Promise<ReturnedFinding[]> {
  const rejected = await rows<FindingDbRow>(
    em,
    `${FINDING_SELECT} where s.revision_id = $1 and s.state = 'rejected' order by f.ordinal`,
    [revisionId],
  );
  const lines = await rows<{ structure_number: string; reason: string | null }>(
    em,
    `select r.structure_number, d.reason from lines l join records r on r.id = l.record_id
     join lateral (select * from decisions x where x.record_id = r.id order by x.seq desc limit 1) d on true
     where l.revision_id = $1 and l.state = 'returned' and d.decision = 'return' order by r.ordinal`,
    [revisionId],
  );
  return [
    ...rejected.map((finding) => describe(finding)),
    ...lines.map((line) => ({
      structureNumber: line.structure_number,
      finding: 'Line returned',
      detail: '',
      due: DUE.correct,
      dueOn: '',
      reason: line.reason ?? '',
    })),
  ];
}

function describe(finding: FindingDbRow): ReturnedFinding {
  const { title, message } = renderFinding(toFinding(finding, false));
  const cell = finding.cell ? ` Cell ${finding.sheet}!${finding.cell}.` : '';
  return {
    structureNumber: finding.structure_number ?? '',
    finding: title,
    detail: `${message}${cell}`,
    due: finding.action ? DUE[finding.action] : '',
    dueOn: finding.due_on ?? '',
    reason: finding.reason ?? '',
  };
}
