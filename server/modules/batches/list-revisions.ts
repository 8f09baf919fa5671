import type { EntityManager } from '@mikro-orm/postgresql';
import { rows } from '#server/db/rows.ts';
import type { Skipped } from '#shared/check/types.ts';
import { findingTitle } from '#shared/findings/render.ts';
import type { BatchRevision } from '#shared/generated/api-types.ts';
import type { Actor } from '#shared/permissions/ability.ts';

type Found = Omit<BatchRevision, 'rulesOff'> & { skipped: Skipped[] };

/** Revisions of a batch, newest first. What the check of a draft came to is not the owner's to know yet. */
export async function listRevisions(
  em: EntityManager,
  options: { batch: { id: string }; actor: Actor },
): Promise<{ items: BatchRevision[] }> {
  const found = await rows<Found>(
    em,
    `select v.id, v.n as number, v.status, v.submitted_at as "submittedAt", v.decided_at as "decidedAt",
       case when shown then coalesce((run.counts ->> 'lines')::int, 0) else 0 end as lines,
       case when shown then coalesce(run.skipped, '[]') else '[]' end as skipped
     from revisions v left join check_runs run on run.id = v.run_id
     cross join lateral (select $2::boolean or v.submitted_at is not null as shown) to_see
     where v.batch_id = $1 order by v.n desc`,
    [options.batch.id, options.actor.orgKind === 'contractor'],
  );
  return {
    items: found.map(({ skipped, ...revision }) => ({
      ...revision,
      rulesOff: skipped
        .filter(({ reason }) => reason === 'off')
        .map(({ code, standards }) => ({
          code,
          title: findingTitle(code),
          standards: standards ? [...standards] : null,
        })),
    })),
  };
}
