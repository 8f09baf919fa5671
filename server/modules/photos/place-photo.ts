import type { EntityManager } from '@mikro-orm/postgresql';
import { row, run } from '#server/db/rows.ts';
import { notFound, problem } from '#server/http/problem.ts';
import { accepted } from '#server/modules/batches/accepted.ts';
import { addInput } from '#server/modules/batches/add-input.ts';
import { lockRevision, stateOf, type LockedRevision } from '#server/modules/batches/lock-revision.ts';
import { appendTrail } from '#server/trail/append-trail.ts';
import type { Actor } from '#shared/permissions/ability.ts';
import { moveRevision } from '#shared/review/revision.ts';

type Options = { photoId: string; contractorId: string | null; actor: Actor };
type Found = { id: string; batch_id: string; file_name: string };
type Match = { lineId: string; view: string } | null;

/**
 * Puts a photograph on a line by hand, or takes it off (`match` null). A hand's word stands over later workbooks, and
 * the rules look at the batch again.
 * @throws Problem 404; 409 when the batch is handed in; 422 for a line of another batch
 */
export async function placePhoto(em: EntityManager, options: Options & { match: Match }): Promise<void> {
  const { photoId, contractorId, actor, match } = options;
  await em.transactional(async (tx) => {
    const photo = await row<Found>(
      tx,
      `select p.id, p.batch_id, p.file_name from photos p join batches b on b.id = p.batch_id
       where p.id = $1 and ($2::uuid is null or b.contractor_id = $2)`,
      [photoId, contractorId],
    );
    if (!photo) throw notFound();
    const revision = await lockRevision(tx, { id: photo.batch_id, contractorId });
    const moved = accepted(moveRevision(stateOf(revision), { type: 'upload' }, actor));
    if (match) await ensureLine(tx, photo.batch_id, match.lineId);
    if (!(await write(tx, { photo, revision, match, actor }))) return;
    await addInput(
      tx,
      { id: revision.id, input: revision.input, status: moved.status },
      { kind: 'placement', actorId: actor.id },
    );
    await appendTrail(tx, {
      actor,
      action: match ? 'photo.placed' : 'photo.taken-off',
      subject: { type: 'photo', id: photo.id, label: photo.file_name },
      payload: { batch: revision.batch_number, revision: revision.n, ...match },
    });
  });
}

async function ensureLine(em: EntityManager, batchId: string, lineId: string): Promise<void> {
  const line = await row(em, 'select id from lines where id = $1 and batch_id = $2', [lineId, batchId]);
  if (!line)
    throw problem(422, 'photo.line', 'Choose a line of this batch.', {
      errors: [{ pointer: '/lineId', code: 'lineId.unknown', detail: 'This is no line of this batch.' }],
    });
}

/** False: it lies there already. */
async function write(
  em: EntityManager,
  options: { photo: Found; revision: LockedRevision; match: Match; actor: Actor },
): Promise<boolean> {
  const { photo, revision, match, actor } = options;
  const last = await row<{
    seq: number;
    line_id: string | null;
    view: string | null;
    removed: boolean;
    method: string;
  }>(
    em,
    'select seq, line_id, view, removed, method from photo_matches where photo_id = $1 order by seq desc limit 1',
    [photo.id],
  );
  const same = match
    ? last?.method === 'hand' && !last.removed && last.line_id === match.lineId && last.view === match.view
    : !last || last.removed;
  if (same) return false;
  await run(
    em,
    `insert into photo_matches (photo_id, revision_id, seq, line_id, view, method, removed, actor_id)
     values ($1, $2, $3, $4, $5, 'hand', $6, $7)`,
    [
      photo.id,
      revision.id,
      (last?.seq ?? 0) + 1,
      match?.lineId ?? null,
      match?.view ?? null,
      match === null,
      actor.id,
    ],
  );
  return true;
}
