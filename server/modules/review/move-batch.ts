import type { EntityManager } from '@mikro-orm/postgresql';
import { row, run } from '#server/db/rows.ts';
import { problem } from '#server/http/problem.ts';
import { accepted } from '#server/modules/batches/accepted.ts';
import { lockRevision, stateOf } from '#server/modules/batches/lock-revision.ts';
import { appendTrail } from '#server/trail/append-trail.ts';
import type { Actor } from '#shared/permissions/ability.ts';
import { moveRevision, type RevisionAction } from '#shared/review/revision.ts';

type Move = Extract<RevisionAction, { type: 'take' | 'release' | 'assign' }>;
const TRAIL: Readonly<Record<Move['type'], string>> = {
  take: 'batch.taken',
  release: 'batch.released',
  assign: 'batch.assigned',
};

/**
 * An inspector takes or releases a submitted batch; an administrator hands it to another inspector.
 * Taking what one already holds changes nothing.
 * @throws Problem 404; 409 from the state machine; 422 when the person assigned is no active inspector
 */
export async function moveBatch(
  em: EntityManager,
  options: { batchId: string; actor: Actor; move: Move; reason?: string },
): Promise<void> {
  const { batchId, actor, move } = options;
  await em.transactional(async (tx) => {
    const revision = await lockRevision(tx, { id: batchId, contractorId: null });
    if (move.type === 'assign') await ensureInspector(tx, move.inspectorId);
    const moved = accepted(moveRevision(stateOf(revision), move, actor));
    if (moved.status === revision.status && moved.inspectorId === revision.inspector_id) return;
    await run(
      tx,
      `update revisions set status = $2, inspector_id = $3, taken_at = case when $3::uuid is null then null else now() end,
         worked_at = case when $3::uuid is null then null else now() end, version = version + 1 where id = $1`,
      [revision.id, moved.status, moved.inspectorId],
    );
    await appendTrail(tx, {
      actor,
      action: TRAIL[move.type],
      subject: { type: 'batch', id: batchId, label: revision.batch_number },
      payload: {
        revision: revision.n,
        ...(move.type === 'assign' ? { inspector: move.inspectorId, before: revision.inspector_id } : {}),
        ...(options.reason ? { reason: options.reason } : {}),
      },
    });
  });
}

async function ensureInspector(em: EntityManager, id: string): Promise<void> {
  const found = await row(em, `select 1 from users where id = $1 and role = 'inspector' and active`, [id]);
  if (!found)
    throw problem(422, 'review.not-an-inspector', 'Choose an active inspector.', {
      errors: [
        { pointer: '/inspectorId', code: 'inspectorId.unknown', detail: 'This is no active inspector.' },
      ],
    });
}
