import type { EntityManager } from '@mikro-orm/postgresql';
import { rows, run } from '#server/db/rows.ts';
import { lockRevision } from '#server/modules/batches/lock-revision.ts';
import { appendTrail } from '#server/trail/append-trail.ts';
import type { Actor } from '#shared/permissions/ability.ts';
import { ensureDeciding } from './ensure-deciding.ts';
import { refreshLineStates } from './refresh-line-states.ts';
import { writeRecordDecisions } from './write-record-decision.ts';

/**
 * Approves every undecided line that has no nonconformity and no query, each with its own decision and trail entry.
 * @returns how many
 */
export async function approveCleanLines(
  em: EntityManager,
  options: { batchId: string; actor: Actor },
): Promise<number> {
  const { batchId, actor } = options;
  return em.transactional(async (tx) => {
    const revision = await lockRevision(tx, { id: batchId, contractorId: null });
    ensureDeciding({ ...revision, revision_status: revision.status, line_state: null }, actor);
    const clean = await rows<{ line_id: string; record_id: string; structure_number: string }>(
      tx,
      `select l.id as line_id, l.record_id, l.structure_number from lines l join records r on r.id = l.record_id
       where l.revision_id = $1 and l.state = 'undecided' and not exists (
         select 1 from finding_states s where s.record_id = l.record_id and s.severity <> 'note'
       ) order by r.ordinal`,
      [revision.id],
    );
    if (clean.length === 0) return 0;
    await writeRecordDecisions(tx, {
      recordIds: clean.map((line) => line.record_id),
      decision: 'approve',
      reason: null,
      actorId: actor.id,
    });
    await refreshLineStates(
      tx,
      clean.map((line) => line.line_id),
    );
    await run(tx, 'update revisions set worked_at = now(), version = version + 1 where id = $1', [
      revision.id,
    ]);
    for (const line of clean) {
      await appendTrail(tx, {
        actor,
        action: 'record.approved',
        subject: { type: 'record', id: line.record_id, label: line.structure_number },
        payload: { batch: revision.batch_number, revision: revision.n, together: clean.length },
      });
    }
    return clean.length;
  });
}
