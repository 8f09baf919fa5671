import type { EntityManager } from '@mikro-orm/postgresql';
import { run } from '#server/db/rows.ts';
import { appendTrail } from '#server/trail/append-trail.ts';
import type { Actor } from '#shared/permissions/ability.ts';
import { moveRevision } from '#shared/review/revision.ts';
import { accepted } from './accepted.ts';
import { lockRevision, stateOf } from './lock-revision.ts';

/**
 * Takes a submitted revision back while no inspector has taken it.
 * @throws Problem 404; 409 once it is taken
 */
export async function withdrawBatch(
  em: EntityManager,
  options: { batchId: string; contractorId: string | null; actor: Actor },
): Promise<void> {
  const { batchId, contractorId, actor } = options;
  await em.transactional(async (tx) => {
    const revision = await lockRevision(tx, { id: batchId, contractorId });
    const moved = accepted(moveRevision(stateOf(revision), { type: 'withdraw' }, actor));
    await run(
      tx,
      `update revisions set status = $2, submitted_at = null, submitted_by = null, version = version + 1 where id = $1`,
      [revision.id, moved.status],
    );
    await run(tx, 'select close_findings($1)', [revision.id]);
    // Returned lines stay returned: only what was handed in with this revision is taken back.
    await run(
      tx,
      `update lines l set record_id = before.record_id, revision_id = before.revision_id,
         state = case when before.outcome in ('returned', 'held', 'approved', 'abandoned') then before.outcome else 'undecided' end,
         version = l.version + 1
       from lines own
       left join lateral (
         select o.record_id, o.revision_id, o.outcome from outcomes o where o.line_id = own.id order by o.seq desc limit 1
       ) before on true
       where own.revision_id = $1 and l.id = own.id`,
      [revision.id],
    );
    await appendTrail(tx, {
      actor,
      action: 'batch.withdrawn',
      subject: { type: 'batch', id: batchId, label: revision.batch_number },
      payload: { revision: revision.n },
    });
  });
}
