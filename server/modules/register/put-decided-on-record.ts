import type { EntityManager } from '@mikro-orm/postgresql';
import { rows } from '#server/db/rows.ts';
import { appendTrailMany } from '#server/trail/append-trail-many.ts';
import type { Actor } from '#shared/permissions/ability.ts';

/** A decided revision is on record once none of its lines waits for the clerk, an engineer or an inspector any more. */
export async function putDecidedOnRecord(
  em: EntityManager,
  revisionIds: readonly string[],
  actor: Actor,
): Promise<void> {
  const moved = await rows<{ batch_id: string; batch_number: string; n: number }>(
    em,
    `update revisions v set status = 'on-record', version = v.version + 1 from batches b
     where v.id = any($1::uuid[]) and v.status = 'decided' and b.id = v.batch_id
       and not exists (select 1 from lines l where l.revision_id = v.id and l.state in ('approved', 'held', 'undecided'))
     returning v.batch_id, b.number as batch_number, v.n`,
    [revisionIds],
  );
  await appendTrailMany(
    em,
    moved.map((revision) => ({
      actor,
      action: 'batch.on-record',
      subject: { type: 'batch', id: revision.batch_id, label: revision.batch_number },
      payload: { revision: revision.n },
    })),
  );
}
