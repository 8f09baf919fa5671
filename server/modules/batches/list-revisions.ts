import type { EntityManager } from '@mikro-orm/postgresql';
import { rows } from '#server/db/rows.ts';
import type { BatchRevision } from '#shared/generated/api-types.ts';
import type { Actor } from '#shared/permissions/ability.ts';

/** Revisions of a batch, newest first. A draft's number of lines is not the owner's to know yet. */
export async function listRevisions(
  em: EntityManager,
  options: { batch: { id: string }; actor: Actor },
): Promise<{ items: BatchRevision[] }> {
  const items = await rows<BatchRevision>(
    em,
    `select v.id, v.n as number, v.status, v.submitted_at as "submittedAt", v.decided_at as "decidedAt",
       case when $2::boolean or v.submitted_at is not null then coalesce((run.counts ->> 'lines')::int, 0) else 0 end as lines
     from revisions v left join check_runs run on run.id = v.run_id
     where v.batch_id = $1 order by v.n desc`,
    [options.batch.id, options.actor.orgKind === 'contractor'],
  );
  return { items };
}
