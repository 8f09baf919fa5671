import type { EntityManager } from '@mikro-orm/postgresql';
import { row } from '#server/db/rows.ts';
import { enqueue } from '#server/jobs/enqueue.ts';
import { setProgress } from '#server/jobs/progress.ts';
import { addInput } from '#server/modules/batches/add-input.ts';
import { checkRevisionJob } from '#server/modules/check/check-revision.job.ts';
import { appendTrail } from '#server/trail/append-trail.ts';
import type { RevisionStatus } from '#shared/review/states.ts';
import { PHOTO_PIPELINE } from './pipeline.ts';

type Newest = {
  id: string;
  n: number;
  input: number;
  status: RevisionStatus;
  batch_number: string;
  /** Photographs without facts: another job of the batch is to read them. */
  unprepared: number;
  /** A check waits for the photographs. */
  waiting: boolean;
  /** The newest check ended before the facts of some photograph were there. */
  unseen: boolean;
};

const NEWEST = `
select v.id, v.n, v.input, v.status, b.number as batch_number,
  (select count(*) from photos p where p.batch_id = b.id
     and not exists (select from photo_facts f where f.sha256 = p.sha256 and f.pipeline = $2)) as unprepared,
  exists (select from check_runs r where r.revision_id = v.id and r.input = v.input and r.state = 'queued') as waiting,
  exists (select from check_runs r join photos p on p.batch_id = b.id
     join photo_facts f on f.sha256 = p.sha256 and f.pipeline = $2
     where r.revision_id = v.id and r.input = v.input and r.state = 'done' and f.at > r.started_at) as unseen
from batches b join lateral (select * from revisions where batch_id = b.id order by n desc limit 1) v on true
where b.id = $1`;

/**
 * Ends the preparing of a batch's photographs, well or with a problem, and asks for the check that waited for it. Where
 * a check went on without them (their job was parked, and done later), an open batch is checked again.
 */
export async function finishPhotos(
  em: EntityManager,
  { batchId, problem }: { batchId: string; problem: { code: string; detail: string } | null },
): Promise<void> {
  await em.transactional(async (tx) => {
    await row(tx, 'select id from batches where id = $1 for update', [batchId]);
    const newest = await row<Newest>(tx, NEWEST, [batchId, PHOTO_PIPELINE]);
    if (!newest || (problem === null && newest.unprepared > 0)) return;
    const state = problem === null ? 'done' : 'failed';
    await setProgress(tx, { subject: `photos:${batchId}`, state, done: 0, total: null, problem });
    const { id, input } = newest;
    if (newest.waiting)
      await enqueue(tx, checkRevisionJob, { revisionId: id, input }, { key: `check:${id}:${input}` });
    else if (newest.unseen && newest.status === 'checked') await checkAgain(tx, batchId, newest);
  });
}

async function checkAgain(em: EntityManager, batchId: string, newest: Newest): Promise<void> {
  const { id, input } = newest;
  const added = await addInput(em, { id, input, status: 'checking' }, { kind: 'recheck', actorId: null });
  await appendTrail(em, {
    actor: null,
    action: 'batch.checked-again',
    subject: { type: 'batch', id: batchId, label: newest.batch_number },
    payload: { revision: newest.n, input: added.n },
  });
}
