import type { EntityManager } from '@mikro-orm/postgresql';
import { row, rows, run } from '#server/db/rows.ts';
import { conflict } from '#server/http/problem.ts';
import { accepted } from '#server/modules/batches/accepted.ts';
import { lockRevision, stateOf } from '#server/modules/batches/lock-revision.ts';
import { appendTrail } from '#server/trail/append-trail.ts';
import type { CloseReviewReply } from '#shared/generated/api-types.ts';
import type { Actor } from '#shared/permissions/ability.ts';
import { closeReview as close } from '#shared/review/close-review.ts';
import { isRefusal } from '#shared/review/outcome.ts';
import { moveRevision } from '#shared/review/revision.ts';
import type { LineState } from '#shared/review/states.ts';
import { mailReviewClosed } from './mail-review-closed.ts';
import { openNextRevision } from './open-next-revision.ts';
import { writeOutcomes } from './write-outcomes.ts';

type ReviewLineRow = {
  id: string;
  recordId: string;
  revisionId: string;
  structure_number: string;
  state: LineState;
};

/**
 * Ends the review: logs what each line has come to, opens the actions due, makes the next revision of what came back,
 * and writes to the contractor.
 * @returns ids of the lines
 * @throws Problem 404; 409 naming the undecided lines in `undecided`
 */
export async function closeReview(
  em: EntityManager,
  options: { batchId: string; actor: Actor },
): Promise<CloseReviewReply> {
  const { batchId, actor } = options;
  return em.transactional(async (tx) => {
    const revision = await lockRevision(tx, { id: batchId, contractorId: null });
    const moved = accepted(moveRevision(stateOf(revision), { type: 'close' }, actor));
    const lines = await rows<ReviewLineRow>(
      tx,
      `select l.id, l.record_id as "recordId", l.revision_id as "revisionId", l.structure_number, l.state
       from lines l join records r on r.id = l.record_id where l.revision_id = $1 order by r.ordinal`,
      [revision.id],
    );
    const closing = close(
      lines.map((line) => ({
        recordId: line.recordId,
        structureNumber: line.structure_number,
        state: line.state,
      })),
      await openBatchFindings(tx, revision.id),
    );
    if (isRefusal(closing)) {
      const undecided = lines.filter((line) => line.state === 'undecided');
      throw conflict(closing.refused, closing.detail, {
        extra: {
          undecided: undecided.map(({ id, recordId, structure_number }) => ({
            lineId: id,
            recordId,
            structureNumber: structure_number,
          })),
        },
      });
    }
    await run(
      tx,
      `update revisions set status = $2, decided_at = now(), decided_by = $3, version = version + 1 where id = $1`,
      [revision.id, moved.status, actor.id],
    );
    await writeOutcomes(tx, {
      lines: lines.filter((line) => line.state !== 'on-record' && line.state !== 'abandoned'),
      actorId: actor.id,
      reason: null,
    });
    const dueOn = await openActions(tx, revision.id, revision.contractor_id);
    const { approved, returned, held } = closing.accepted;
    const nextRevision = (await anyReturned(tx, batchId))
      ? await openNextRevision(tx, { batchId, dueOn })
      : null;
    await appendTrail(tx, {
      actor,
      action: 'review.closed',
      subject: { type: 'batch', id: batchId, label: revision.batch_number },
      payload: {
        revision: revision.n,
        approved: approved.length,
        returned: returned.length,
        held: held.length,
        nextRevision,
      },
    });
    await mailReviewClosed(tx, { revision, closing: closing.accepted, nextRevision, dueOn, actor });
    return { approved: [...approved], returned: [...returned], held: [...held], nextRevision };
  });
}

/** Findings that belong to no line and still want a decision. */
async function openBatchFindings(em: EntityManager, revisionId: string): Promise<number> {
  const found = await row<{ n: number }>(
    em,
    `select count(*)::int as n from finding_states
     where revision_id = $1 and line_id is null and severity <> 'note' and state = 'open'`,
    [revisionId],
  );
  return found?.n ?? 0;
}

/** What was rejected becomes an open action of the contractor. Gives back the first day on which one is due. */
async function openActions(
  em: EntityManager,
  revisionId: string,
  contractorId: string,
): Promise<string | null> {
  await run(
    em,
    `insert into actions (finding_id, type, text, owner_org_id, due_on)
     select s.finding_id, s.action, d.reason, $2, s.due_on
     from finding_states s join decisions d on d.finding_id = s.finding_id and d.seq = s.version
     where s.revision_id = $1 and s.state = 'rejected'`,
    [revisionId, contractorId],
  );
  const found = await row<{ due_on: string | null }>(
    em,
    `select min(due_on) as due_on from finding_states where revision_id = $1 and state = 'rejected'`,
    [revisionId],
  );
  return found?.due_on ?? null;
}

async function anyReturned(em: EntityManager, batchId: string): Promise<boolean> {
  return (
    (await row(em, `select 1 from lines where batch_id = $1 and state = 'returned' limit 1`, [batchId])) !==
    null
  );
}
